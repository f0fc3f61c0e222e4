import { randomUUID } from 'node:crypto';

import { newFirm, signedIn } from '../support/firm';
import { newJob, type Agent, type TestJob } from '../support/job';
import {
  buildUpInput,
  contactInput,
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
let stranger: Agent;
let made: TestJob;
/** The same things of another firm, and of another job of the same firm. */
let foreign: [whose: string, job: TestJob][];
beforeAll(async () => {
  stack = await startStack();
  agent = await signedIn(stack, await newFirm(stack.services));
  stranger = await signedIn(stack, await newFirm(stack.services));
  made = await newJob(agent);
  foreign = [
    ['another firm', await newJob(stranger)],
    ['another job', await newJob(agent, { number: 'TST-002' })],
  ];
});
afterAll(() => stack.stop());

it('hides another firm’s job at every address, reading and writing', async () => {
  const { path } = foreign[0]![1];
  await agent.get(path).expect(404);
  await agent
    .patch(path)
    .send({ ...jobInput, version: 1 })
    .expect(404);
  for (const noun of ['levels', 'drawings', 'addenda', 'places', 'services', 'build-ups', 'specification', 'runs']) {
    await agent.get(`${path}/${noun}`).expect(404);
  }
  await agent.post(`${path}/levels`).send(levelInput).expect(404);
  await agent.patch(`${path}/runs`).send({ put: [], drop: [] }).expect(404);
  expect((await stranger.get(path).expect(200)).body).toEqual(foreign[0]![1].job);
});

it('refuses rows of another firm or job at the field that names them', async () => {
  for (const [whose, job] of foreign) {
    const { service, place, where } = job;
    const refused = async (path: string, input: object, fields: string[]) => {
      const { body } = await agent.post(`${made.path}/${path}`).send(input).expect(400);
      expect([whose, Object.keys(body.fields)]).toEqual([whose, fields]);
    };
    await refused('build-ups', { ...buildUpInput(service.id), placeIds: [place.id] }, ['serviceId', 'placeIds.0']);
    await refused('specification', specificationInput(service.id), ['serviceId']);
    const limits = [{ kind: 'touch', placeId: place.id }];
    await refused('services', { ...serviceInput, name: 'S', limits }, ['limits.0.placeId']);
    const run = { ...runInput(where), id: randomUUID(), version: null };
    const { body } = await agent
      .patch(`${made.path}/runs`)
      .send({ put: [run], drop: [] })
      .expect(400);
    const fields = ['serviceId', 'placeId', 'levelId', 'drawingId'].map((field) => `put.0.${field}`);
    expect([whose, Object.keys(body.fields)]).toEqual([whose, fields]);
  }
  expect((await agent.get(`${made.path}/runs`).expect(200)).body.runs).toEqual([]);
});

it('does not know rows of another firm or job', async () => {
  for (const [, { level, place, where, path }] of foreign) {
    await agent
      .patch(`${made.path}/levels/${level.id}`)
      .send({ ...levelInput, version: 1 })
      .expect(404);
    await agent
      .patch(`${made.path}/places/${place.id}`)
      .send({ ...placeInput, version: 1 })
      .expect(404);
    await agent.delete(`${made.path}/levels/${level.id}?version=1`).expect(404);
    const owner = path === foreign[0]![1].path ? stranger : agent;
    const run = { ...runInput(where), id: randomUUID(), version: null };
    await owner
      .patch(`${path}/runs`)
      .send({ put: [run], drop: [] })
      .expect(200);
    const change = { put: [{ ...runInput(made.where), id: run.id, version: 1 }], drop: [] };
    expect((await agent.patch(`${made.path}/runs`).send(change).expect(400)).body.fields).toEqual({
      'put.0.id': 'This run does not exist',
    });
    const drop = { put: [], drop: [{ id: run.id, version: 1 }] };
    expect((await agent.patch(`${made.path}/runs`).send(drop).expect(400)).body.fields).toEqual({
      'drop.0.id': 'This run does not exist',
    });
    expect((await owner.get(`${path}/runs`).expect(200)).body.runs).toHaveLength(1);
  }
});

it('does not know another firm’s contacts', async () => {
  const { body: theirs } = await stranger.post('/api/contacts').send(contactInput).expect(201);
  await agent
    .patch(`/api/contacts/${theirs.id}`)
    .send({ ...contactInput, version: 1 })
    .expect(404);
  await agent.delete(`/api/contacts/${theirs.id}?version=1`).expect(404);
  for (const id of [theirs.id, randomUUID()]) {
    const input = { ...jobInput, number: 'CON', contactIds: [id] };
    expect((await agent.post('/api/jobs').send(input).expect(400)).body.fields).toEqual({
      'contactIds.0': 'Not known here',
    });
  }
  const { body: ours } = await agent.post('/api/contacts').send(contactInput).expect(201);
  const twice = { ...jobInput, number: 'CON', contactIds: [ours.id, ours.id] };
  expect((await agent.post('/api/jobs').send(twice).expect(400)).body.fields).toEqual({
    'contactIds.1': 'Named twice',
  });
});

it('answers unknown ids and impossible versions, never with a 500', async () => {
  const list = `${made.path}/levels`;
  await agent.get(`/api/jobs/${randomUUID()}`).expect(404);
  await agent
    .patch(`${list}/${randomUUID()}`)
    .send({ ...levelInput, version: 1 })
    .expect(404);
  for (const version of [0, -1, 1.5, null, '1', 1e300]) {
    await agent
      .patch(`${list}/${made.level.id}`)
      .send({ ...levelInput, version })
      .expect(400);
  }
  for (const version of ['0', '-1', '1.5', 'NaN', 'Infinity', '', '1e300', '1&version=2']) {
    await agent.delete(`${list}/${made.level.id}?version=${version}`).expect(400);
  }
  // a version that no row can have yet is stale, also beyond what the column holds
  for (const version of [2, 3_000_000_000, Number.MAX_SAFE_INTEGER]) {
    await agent
      .patch(`${list}/${made.level.id}`)
      .send({ ...levelInput, version })
      .expect(409);
    await agent.delete(`${list}/${made.level.id}?version=${version}`).expect(409);
  }
});

it('takes an id in capitals for the same id', async () => {
  const shout = (text: string) => text.toUpperCase();
  const { serviceId, placeId, levelId } = made.where;
  const where = { serviceId: shout(serviceId), placeId: shout(placeId), levelId: shout(levelId), drawingId: null };
  const run = { ...runInput(where, 'R-CAPS'), id: shout(randomUUID()), version: null };
  const patch = () => agent.patch(`${shout(made.path).replace('/API/JOBS', '/api/jobs')}/runs`);
  const first = await patch()
    .send({ put: [run], drop: [] })
    .expect(200);
  const second = await patch()
    .send({ put: [run], drop: [] })
    .expect(200);
  expect(second.body).toEqual(first.body);
  const level = `${made.path}/levels/${shout(levelId)}`;
  await agent
    .patch(level)
    .send({ ...levelInput, version: 1 })
    .expect(200);
});

it('refuses what is no JSON, and what is too much of it', async () => {
  const send = (body: string) => agent.post('/api/jobs').set('Content-Type', 'application/json').send(body);
  expect((await send('{"number":').expect(400)).body.detail).toBe('Malformed JSON');
  await send('"text"').expect(400);
  await send('null').expect(400);
  await agent.post('/api/jobs').set('Content-Type', 'text/plain').send('number=1').expect(400);
  const big = JSON.stringify({ ...jobInput, scope: 'x'.repeat(10_000_000) });
  expect((await send(big).expect(413)).body.type).toBe('/problems/too-large');
  const deep = `${'['.repeat(100_000)}${']'.repeat(100_000)}`;
  await send(deep).expect(400);
});
