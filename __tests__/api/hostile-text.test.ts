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
} from '../support/job-inputs';
import { startStack, type Stack } from '../support/stack';

jest.setTimeout(60_000); // hundreds of requests

let stack: Stack;
let agent: Agent;
let made: TestJob;
beforeAll(async () => {
  stack = await startStack();
  agent = await signedIn(stack, await newFirm(stack.services));
  made = await newJob(agent);
});
afterAll(() => stack.stop());

const hostile = [
  `'); drop table runs; --`,
  `<script>alert(1)</script>`,
  `"><img src=x>`,
  `\${7*7} {{7*7}} %s %n`,
  `\\u0000 \\x00 %00`,
  '\u202Eright to left\u202C מפוח عزل',
  '🔥🧊 👩🏽‍🔧 e\u0301 ﬁ',
  '=1+1',
  'null',
];
/** Fits a text into a field that holds little. */
const short = (text: string) => [...text].slice(0, 9).join('').trim();

describe.each(hostile)('%j', (text) => {
  const comesBack = async (path: string, input: object) => {
    const { body: row } = await agent.post(path).send(input).expect(201);
    expect(row).toEqual({ ...input, id: expect.any(String), version: 1 });
    expect((await agent.get(path).expect(200)).body).toContainEqual(row);
    if (path !== '/api/jobs') await agent.delete(`${path}/${row.id}?version=1`).expect(204);
  };

  it('is stored and returned as it is in every text of a job', async () => {
    const { path, service } = made;
    const specification = { number: text, title: text, revision: text, date: null };
    const job = { ...jobInput, number: short(text), name: text, site: text, scope: `${text}\n${text}`, specification };
    const { body } = await agent.post('/api/jobs').send(job).expect(201);
    expect(body).toEqual({ ...job, id: expect.any(String), version: 1 });
    expect((await agent.get(`/api/jobs/${body.id}`).expect(200)).body).toEqual(body);

    await comesBack('/api/contacts', { ...contactInput, name: text, company: text, role: text });
    await comesBack(`${path}/levels`, { ...levelInput, name: text });
    const drawing = { ...drawingInput, number: text, title: text, revision: short(text), scale: text };
    await comesBack(`${path}/drawings`, drawing);
    await comesBack(`${path}/addenda`, { ...addendumInput, changes: text });
    const source = { ...placeInput.conditions.mean, source: text };
    const conditions = { ...placeInput.conditions, mean: source };
    await comesBack(`${path}/places`, { ...placeInput, name: text, touchLimitSource: text, note: text, conditions });
    const fluid = { ...serviceInput, name: text, fluid: text, codeExempt: text, note: text };
    await comesBack(`${path}/services`, fluid);
    await comesBack(`${path}/build-ups`, { ...buildUpInput(service.id), note: text });
    await comesBack(`${path}/specification`, { ...specificationInput(service.id), label: short(text), note: text });
  });

  it('is stored and returned as it is in every text of a run', async () => {
    const run = {
      ...runInput(made.where, short(text)),
      title: text,
      note: text,
      status: 'on-hold',
      hold: { reason: text, by: text },
      override: { reason: text, state: null, layers: null, finishId: null, vapourRetarder: null, codeExempt: text },
      id: randomUUID(),
    };
    const patch = (put: object[], drop: object[]) => agent.patch(`${made.path}/runs`).send({ put, drop });
    const { body } = await patch([{ ...run, version: null }], []).expect(200);
    expect(body.put).toEqual([{ ...run, version: 1 }]);
    expect((await agent.get(`${made.path}/runs`).expect(200)).body.runs).toEqual(body.put);
    await patch([], [{ id: run.id, version: 1 }]).expect(200);
  });

  it('is nowhere an id, a version or a code', async () => {
    const inPath = encodeURIComponent(text);
    await agent.get(`/api/jobs/${inPath}`).expect(404);
    await agent.get(`/api/jobs/${inPath}/runs`).expect(404);
    await agent
      .patch(`${made.path}/levels/${inPath}`)
      .send({ ...levelInput, version: 1 })
      .expect(404);
    await agent.delete(`${made.path}/levels/${made.level.id}?version=${inPath}`).expect(400);
    for (const field of ['currency', 'codeEdition', 'climateZone', 'seriesUnit', 'surfaceMethod', 'documentUnits']) {
      const { body } = await agent
        .post('/api/jobs')
        .send({ ...jobInput, number: 'CODE', [field]: text })
        .expect(400);
      expect(Object.keys(body.fields)).toEqual([field]);
    }
    const bidDue = { date: text, time: text, zone: text };
    const { body } = await agent
      .post('/api/jobs')
      .send({ ...jobInput, number: 'CODE', bidDue })
      .expect(400);
    expect(Object.keys(body.fields)).toEqual(['bidDue.date', 'bidDue.time', 'bidDue.zone']);
  });
});

it('takes text to its last character, and not one more', async () => {
  const run = (note: string) => ({ ...runInput(made.where, 'R99'), note, id: randomUUID(), version: null });
  const patch = (note: string) => agent.patch(`${made.path}/runs`).send({ put: [run(note)], drop: [] });
  const { body } = await patch('x'.repeat(601)).expect(400);
  expect(body.fields).toEqual({ 'put.0.note': 'At most 600 characters' });
  await patch('x'.repeat(600)).expect(200);
});
