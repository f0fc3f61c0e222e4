import { newFirm, newMember, signedIn } from '../support/firm';
import { newJob, type Agent, type TestJob } from '../support/job';
import {
  addendumInput,
  buildUpInput,
  drawingInput,
  levelInput,
  placeInput,
  runInput,
  serviceInput,
  specificationInput,
  typed,
} from '../support/job-inputs';
import { startStack, type Stack } from '../support/stack';

let stack: Stack;
let agent: Agent;
let foreman: Agent;
let made: TestJob;
beforeAll(async () => {
  stack = await startStack();
  const owner = await newFirm(stack.services);
  agent = await signedIn(stack, owner);
  foreman = await signedIn(stack, await newMember(stack.services, owner, { role: 'foreman' }));
  made = await newJob(agent);
});
afterAll(() => stack.stop());

/** Nouns of a job with an input, and another that changes it. */
const nouns = (): [path: string, input: object, change: object][] => [
  ['levels', { ...levelInput, name: 'Level 2' }, { name: 'Level 2, plant room', position: 7 }],
  ['drawings', { ...drawingInput, number: 'M-202' }, { ...drawingInput, number: 'M-203', date: null, title: '' }],
  ['addenda', addendumInput, { ...addendumInput, number: 2, acknowledged: false }],
  [
    'places',
    { ...placeInput, name: 'Corridor' },
    {
      ...placeInput,
      name: 'Ward corridor',
      reach: 'public',
      touchLimit: typed('temperature', '43'),
      ductLocation: null,
    },
  ],
  [
    'services',
    { ...serviceInput, name: 'Chilled water' },
    {
      ...serviceInput,
      name: 'Change-over water',
      states: [
        { ...serviceInput.states[0], nature: 'hot' },
        {
          nature: 'cold',
          operating: typed('temperature', '43 °F'),
          lowest: typed('temperature', '5'),
          highest: typed('temperature', '15'),
        },
      ],
      hours: typed('hours', '8760'),
      limits: [{ kind: 'heat-flow', placeId: made.place.id, perLength: null, flux: typed('heatFlux', '30') }],
    },
  ],
  [
    'build-ups',
    buildUpInput(made.service.id),
    { ...buildUpInput(made.service.id), placeIds: [made.place.id], fromDn: null, vapourRetarder: 'mastic-and-mesh' },
  ],
  [
    'specification',
    specificationInput(made.service.id),
    { ...specificationInput(made.service.id), label: 'P02', appliesTo: 'duct', placeIds: [made.place.id] },
  ],
];
const paths = ['levels', 'drawings', 'addenda', 'places', 'services', 'build-ups', 'specification'];
const nounOf = (path: string) => nouns().find(([name]) => name === path)!;

describe.each(paths)('%s', (path) => {
  it('come back as they were typed, change with their version, and go', async () => {
    const [, input, change] = nounOf(path);
    const list = `${made.path}/${path}`;
    const before = (await agent.get(list).expect(200)).body.length;
    const { body: row } = await agent.post(list).send(input).expect(201);
    expect(row).toEqual({ ...input, id: expect.any(String), version: 1 });
    const changed = await agent
      .patch(`${list}/${row.id}`)
      .send({ ...change, version: 1 })
      .expect(200);
    expect(changed.body).toEqual({ ...change, id: row.id, version: 2 });
    const { body: rows } = await agent.get(list).expect(200);
    expect(rows).toHaveLength(before + 1);
    expect(rows).toContainEqual(changed.body);
    await agent.delete(`${list}/${row.id}?version=2`).expect(204);
    expect((await agent.get(list).expect(200)).body).not.toContainEqual(changed.body);
    await agent.delete(`${list}/${row.id}?version=2`).expect(404);
  });

  it('keep both of two edits of one version: one is stored, the other learns what is', async () => {
    const [, input, change] = nounOf(path);
    const list = `${made.path}/${path}`;
    const { body: row } = await agent.post(list).send(input).expect(201);
    const edit = () => agent.patch(`${list}/${row.id}`).send({ ...change, version: 1 });
    const answers = await Promise.all([edit(), edit()]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const refused = answers.find(({ status }) => status === 409)!;
    expect(refused.body).toMatchObject({ type: '/problems/stale', current: { ...change, id: row.id, version: 2 } });
    await agent.delete(`${list}/${row.id}?version=1`).expect(409);
    await agent.delete(`${list}/${row.id}`).expect(400);
    await agent.delete(`${list}/${row.id}?version=2`).expect(204);
  });

  it('are read by a foreman and written by nobody but owner and estimator', async () => {
    const [, input] = nounOf(path);
    const list = `${made.path}/${path}`;
    await foreman.get(list).expect(200);
    await foreman.post(list).send(input).expect(403);
    const { body: row } = await agent.post(list).send(input).expect(201);
    await foreman
      .patch(`${list}/${row.id}`)
      .send({ ...input, version: 1 })
      .expect(403);
    await foreman.delete(`${list}/${row.id}?version=1`).expect(403);
    await agent.delete(`${list}/${row.id}?version=1`).expect(204);
  });

  it('belong to their job: another job does not know them', async () => {
    const [, input, change] = nounOf(path);
    const { body: row } = await agent.post(`${made.path}/${path}`).send(input).expect(201);
    const other = await newJob(agent, { number: `X-${path}` });
    await agent
      .patch(`${other.path}/${path}/${row.id}`)
      .send({ ...change, version: 1 })
      .expect(404);
    await agent.delete(`${other.path}/${path}/${row.id}?version=1`).expect(404);
    await agent.delete(`${made.path}/${path}/${row.id}?version=1`).expect(204);
  });
});

it('keeps what was typed with its unit, beside the value that counts', async () => {
  const { body: job } = await agent.get(made.path).expect(200);
  expect(job.altitude).toEqual({ value: 120 * 0.3048, typed: { text: '120', unit: 'ft' } });
  expect(made.place.touchLimit).toEqual({ value: 60, typed: { text: '140', unit: '°F' } });
});

describe('a row in use', () => {
  it('stays, and says by what it is used', async () => {
    const { path, place, service, level, drawing, where } = await newJob(agent, { number: 'USE-1' });
    const run = (number: string) => ({ ...runInput(where, number), id: crypto.randomUUID(), version: null });
    await agent
      .patch(`${path}/runs`)
      .send({ put: [run('R01'), run('R02')], drop: [] })
      .expect(200);
    await agent
      .post(`${path}/build-ups`)
      .send({ ...buildUpInput(service.id), placeIds: [place.id] })
      .expect(201);
    await agent.post(`${path}/specification`).send(specificationInput(service.id)).expect(201);
    const limited = { ...serviceInput, name: 'Limited', limits: [{ kind: 'touch', placeId: place.id }] };
    await agent.post(`${path}/services`).send(limited).expect(201);
    const detailOf = async (row: string) => {
      const { body } = await agent.delete(`${path}/${row}?version=1`).expect(409);
      expect(body.type).toBe('/problems/conflict');
      return body.detail;
    };
    expect(await detailOf(`places/${place.id}`)).toBe(
      '2 runs, 1 build-up and 1 service with a limit for it use this place',
    );
    expect(await detailOf(`services/${service.id}`)).toBe(
      '2 runs, 1 build-up and 1 specification row use this service',
    );
    expect(await detailOf(`levels/${level.id}`)).toBe('2 runs use this level');
    expect(await detailOf(`drawings/${drawing.id}`)).toBe('2 runs use this drawing');
  });
});
