import { randomUUID } from 'node:crypto';

import { judgementSchema } from '@/api/contracts/judgement';
import type { Run } from '@/api/contracts/run';
import { scheduleSchema, takeoffSchema } from '@/api/contracts/schedule';
import { runStudySchema, workingSchema } from '@/api/contracts/study';
import type { Member } from '@/api/contracts/session';
import { wireTogether } from '@/api/wiring';
import { enterAddendum } from '@/db/seeds/demo/addendum-1';
import { enterJob } from '@/db/seeds/demo/enter-job';

import expected from './services/demo/expected-flags.json';
import { newFirm, newMember, signedIn } from '../support/firm';
import { publicUrl, startStack, type Stack } from '../support/stack';

type Agent = Awaited<ReturnType<typeof signedIn>>;
let stack: Stack;
let owner: Member;
let agent: Agent;
let runs: Run[];
let jobId: string;
let path: string;
beforeAll(async () => {
  stack = await startStack();
  owner = await newFirm(stack.services);
  agent = await signedIn(stack, owner);
  jobId = await enterDemo();
  path = `/api/jobs/${jobId}`;
  runs = (await stack.services.run.list(owner, jobId)).runs;
}, 60_000);
afterAll(() => stack.stop());

async function enterDemo(): Promise<string> {
  const { db, boss } = stack;
  let id = '';
  await wireTogether({ db, boss, config: { bcryptCost: 4, publicUrl } })(owner.firmId, async (servicesAt) => {
    const entering = { services: servicesAt(() => new Date()), member: owner, today: new Date() };
    const entered = await enterJob(entering);
    await enterAddendum(entering, entered);
    id = entered.job.id;
  });
  return id;
}

const runOf = (number: string) => runs.find((run) => run.number === number)!;

it('judges every run of the job as it is stored', async () => {
  const judgement = judgementSchema.parse((await agent.get(`${path}/judgement`).expect(200)).body);
  expect(judgement.runs.map(({ runId }) => runId)).toEqual(runs.map(({ id }) => id));
  const numbers = new Map(runs.map(({ id, number }) => [id, number]));
  const flags = judgement.runs.flatMap((run) => run.flags.map(({ runId, kind }) => `${numbers.get(runId)} ${kind}`));
  expect(flags.toSorted()).toEqual(expected.withAddendum1.map(({ run, kind }) => `${run} ${kind}`).toSorted());
});

it('studies one run: what is put up, and every thickness that is made', async () => {
  const study = runStudySchema.parse((await agent.get(`${path}/runs/${runOf('R30').id}/study`).expect(200)).body);
  expect(study).toMatchObject({
    assembly: { source: 'chosen', specificationLabel: 'P02', layers: [{ thickness: 'in:1.5' }] },
    body: { shape: 'cylinder', width: 0.1143 },
  });
  expect(study.study.candidates[study.used!]!.name).toBe('in:1.5');
});

it('opens the working of a number', async () => {
  const working = (query: string) => agent.get(`${path}/runs/${runOf('R30').id}/working?${query}`);
  for (const about of ['heat-flow', 'surface', 'touch', 'energy-code']) {
    const { steps } = workingSchema.parse((await working(`candidate=2&about=${about}`).expect(200)).body);
    expect(steps.length).toBeGreaterThan(0);
  }
  const { used } = runStudySchema.parse((await agent.get(`${path}/runs/${runOf('R30').id}/study`)).body);
  const [shown, named] = [await working(''), await working(`candidate=${used}&about=heat-flow`)];
  expect(shown.body).toEqual(named.body);
  await working('candidate=2&about=nonsense').expect(400);
  await working('candidate=-1&about=touch').expect(400);
  await working('candidate=99&about=touch').expect(422);
  await working('candidate=2&about=dew-point').expect(422);
});

it('follows a change of a run at once', async () => {
  const run = runOf('R32');
  const bright = { reason: 'As before the addendum', layers: null, state: null, vapourRetarder: null, codeExempt: '' };
  const changed = { ...run, override: { ...bright, finishId: 'std/aluminium-sheet' } };
  await agent
    .patch(`${path}/runs`)
    .send({ put: [changed], drop: [] })
    .expect(200);
  const { study, used, assembly } = runStudySchema.parse((await agent.get(`${path}/runs/${run.id}/study`)).body);
  expect(assembly).toMatchObject({ source: 'chosen', finishName: expect.stringMatching(/alumin/i) });
  const verdict = study.candidates[used!]!.verdicts.find(({ kind }) => kind === 'dew-point');
  expect(verdict).toMatchObject({ verdict: 'not-met', state: 'sweats' });
  await agent
    .patch(`${path}/runs`)
    .send({ put: [{ ...run, version: run.version + 1 }], drop: [] })
    .expect(200);
});

it('gives schedule and takeoff', async () => {
  const schedule = scheduleSchema.parse((await agent.get(`${path}/schedule`).expect(200)).body);
  const takeoff = takeoffSchema.parse((await agent.get(`${path}/takeoff`).expect(200)).body);
  expect(schedule.rows.flatMap(({ runIds }) => runIds).toSorted()).toEqual(runs.map(({ id }) => id).toSorted());
  const pipes = takeoff.lines.filter(({ appliesTo }) => appliesTo === 'pipe');
  expect(pipes.reduce((sum, line) => sum + line.length!, 0)).toBeCloseTo(2296.5, 9);
});

it('lets a foreman read, and nobody of another firm', async () => {
  const foreman = await signedIn(stack, await newMember(stack.services, owner, { role: 'foreman' }));
  const stranger = await signedIn(stack, await newFirm(stack.services));
  for (const what of ['judgement', 'schedule', 'takeoff', `runs/${runOf('R01').id}/study`]) {
    await foreman.get(`${path}/${what}`).expect(200);
    await stranger.get(`${path}/${what}`).expect(404);
  }
});

it('says that a run does not exist, and why one has no study', async () => {
  await agent.get(`${path}/runs/${randomUUID()}/study`).expect(404);
  await agent.get(`${path}/runs/nonsense/study`).expect(404);
  const piece = { ...runOf('E01'), id: randomUUID(), number: 'E09', shape: { kind: 'piece', count: 3 }, version: null };
  await agent
    .patch(`${path}/runs`)
    .send({ put: [piece], drop: [] })
    .expect(200);
  const answer = await agent.get(`${path}/runs/${piece.id}/study`).expect(422);
  expect(answer.body.detail).toBe('E09 is counted, it has no shape to calculate');
});
