import { randomUUID } from 'node:crypto';

import { newFirm, signedIn } from '../support/firm';
import { newJob, type Agent, type TestJob } from '../support/job';
import {
  addendumInput,
  buildUpInput,
  contactInput,
  drawingInput,
  jobInput,
  levelInput,
  placeInput,
  runInput,
  serviceInput,
  specificationInput,
  typed,
} from '../support/job-inputs';
import { asJson, badFor, leavesOf, spoilt } from '../support/spoil';
import { startStack, type Stack } from '../support/stack';

jest.setTimeout(60_000); // hundreds of requests

let stack: Stack;
let agent: Agent;
let made: TestJob;
let firmId: string;
beforeAll(async () => {
  stack = await startStack();
  const owner = await newFirm(stack.services);
  firmId = owner.firmId;
  agent = await signedIn(stack, owner);
  made = await newJob(agent);
});
afterAll(() => stack.stop());

const override = {
  reason: 'As drawn',
  state: serviceInput.states[0]!,
  layers: [{ materialId: 'std/cellular_glass', thickness: 'in:2', installed: typed('dimension', '50') }],
  finishId: 'std/pvc-jacket',
  vapourRetarder: 'none',
  codeExempt: '',
};
const newRun = () => ({
  ...runInput(made.where, `R-${randomUUID().slice(0, 8)}`),
  status: 'on-hold',
  hold: { reason: 'Old lagging', by: 'Olive Owner' },
  override,
  id: randomUUID(),
  version: null,
});

/** Every route that writes, with a body that it takes. */
const writes = (): Record<string, { send: (body: object) => ReturnType<Agent['post']>; body: object }> => {
  const post = (path: string, body: object) => ({ send: (bad: object) => agent.post(path).send(bad), body });
  const patch = (path: string, body: object) => ({ send: (bad: object) => agent.patch(path).send(bad), body });
  const { path, level, place, service, drawing } = made;
  return {
    'POST contacts': post('/api/contacts', contactInput),
    'POST jobs': post('/api/jobs', { ...jobInput, number: 'BAD-1' }),
    'PATCH job': patch(path, { ...jobInput, version: 1 }),
    'POST levels': post(`${path}/levels`, { ...levelInput, name: 'Another' }),
    'PATCH levels': patch(`${path}/levels/${level.id}`, { ...levelInput, version: 1 }),
    'POST drawings': post(`${path}/drawings`, { ...drawingInput, number: 'Another' }),
    'PATCH drawings': patch(`${path}/drawings/${drawing.id}`, { ...drawingInput, version: 1 }),
    'POST addenda': post(`${path}/addenda`, addendumInput),
    'POST places': post(`${path}/places`, { ...placeInput, name: 'Another' }),
    'PATCH places': patch(`${path}/places/${place.id}`, { ...placeInput, version: 1 }),
    'POST services': post(`${path}/services`, { ...serviceInput, name: 'Another' }),
    'PATCH services': patch(`${path}/services/${service.id}`, { ...serviceInput, version: 1 }),
    'POST build-ups': post(`${path}/build-ups`, { ...buildUpInput(service.id), placeIds: [place.id] }),
    'POST specification': post(`${path}/specification`, { ...specificationInput(service.id), placeIds: [place.id] }),
    'PATCH runs': patch(`${path}/runs`, { put: [newRun()], drop: [] }),
  };
};
const routes = [
  'POST contacts',
  'POST jobs',
  'PATCH job',
  'POST levels',
  'PATCH levels',
  'POST drawings',
  'PATCH drawings',
  'POST addenda',
  'POST places',
  'PATCH places',
  'POST services',
  'PATCH services',
  'POST build-ups',
  'POST specification',
  'PATCH runs',
];

const tables = ['contacts', 'jobs', 'levels', 'drawings', 'addenda', 'places', 'services'];
const others = ['build_ups', 'build_ups_places', 'specification_rows', 'specification_rows_places', 'runs'];
/** All that the firm has stored, as text: what is refused must leave no trace. */
async function stored(): Promise<string> {
  const rows = [];
  for (const table of [...tables, ...others])
    rows.push(await stack.owner(table).where({ firm_id: firmId }).orderByRaw('1, 2, 3'));
  return JSON.stringify(rows);
}

it('names every route that writes a job’s data', () => {
  expect(Object.keys(writes())).toEqual(routes);
});

describe.each(routes)('%s', (route) => {
  it('refuses every wrong value of every field, at the field, and stores nothing', async () => {
    const { send, body } = writes()[route]!;
    const before = await stored();
    const whole = asJson(body);
    let tries = 0;
    for (const { path, value } of leavesOf(whole)) {
      for (const [what, bad] of badFor(value)) {
        const mayBeLeftOut = what === 'missing' && path.includes('fittings');
        if (mayBeLeftOut) continue;
        const answer = await send(Object(spoilt(whole, path, bad)));
        const said = `${path.join('.')} as ${what}: ${answer.status} ${JSON.stringify(answer.body)}`;
        expect({ said, status: answer.status }).toEqual({ said, status: 400 });
        const fields = Object.keys(answer.body.fields ?? {});
        const at = path.join('.');
        expect({ said, here: fields.some((field) => at === field || field.startsWith(`${at}.`)) }).toEqual({
          said,
          here: true,
        });
        tries += 1;
      }
    }
    expect(tries).toBeGreaterThan(10);
    expect(await stored()).toBe(before);
  });

  it('refuses what is no object at all', async () => {
    const { send } = writes()[route]!;
    const before = await stored();
    for (const body of [[], [1, 2], {}, { constructor: 1 }]) {
      const { status } = await send(body);
      expect(status).toBe(400);
    }
    expect(await stored()).toBe(before);
  });
});
