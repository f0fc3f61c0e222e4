import { randomUUID } from 'node:crypto';

import type { Run, RunInput } from '@/api/contracts/run';

import { newFirm, newMember, signedIn } from '../support/firm';
import { newJob, type Agent, type TestJob } from '../support/job';
import { runInput, typed } from '../support/job-inputs';
import { startStack, type Stack } from '../support/stack';

jest.setTimeout(60_000); // hundreds of requests

let stack: Stack;
let agent: Agent;
let foreman: Agent;
let made: TestJob;
let jobs = 0;
beforeAll(async () => {
  stack = await startStack();
  const owner = await newFirm(stack.services);
  agent = await signedIn(stack, owner);
  foreman = await signedIn(stack, await newMember(stack.services, owner, { role: 'foreman' }));
});
beforeEach(async () => {
  made = await newJob(agent, { number: `RUN-${(jobs += 1)}` });
});
afterAll(() => stack.stop());

type Put = RunInput & { id: string; version: number | null };
const newRun = (number: string, change: Partial<RunInput> = {}): Put => ({
  ...runInput(made.where, number),
  ...change,
  id: randomUUID(),
  version: null,
});
const patch = (put: Put[], drop: Pick<Run, 'id' | 'version'>[] = []) =>
  agent.patch(`${made.path}/runs`).send({ put, drop });
const list = async (): Promise<Run[]> => (await agent.get(`${made.path}/runs`).expect(200)).body.runs;

const length = typed('length', '12.5');
const dimension = (text: string) => typed('dimension', text);
const shapes: RunInput['shape'][] = [
  {
    kind: 'pipe',
    size: { standard: 'astm-copper', nominal: '2 in' },
    length: typed('length', '150 ft'),
    orientation: 'vertical',
  },
  {
    kind: 'pipe',
    size: { standard: 'other', outsideDiameter: dimension('2.375 in') },
    length,
    orientation: 'horizontal',
  },
  { kind: 'round-duct', diameter: dimension('250'), length },
  { kind: 'rectangular-duct', width: dimension('600'), height: dimension('400'), length },
  {
    kind: 'vessel',
    diameter: dimension('900'),
    length: dimension('1900'),
    orientation: 'vertical',
    ends: 'domed',
    count: 1,
  },
  { kind: 'flat', area: typed('area', '12 ft²'), height: dimension('500'), count: 2 },
  { kind: 'piece', count: 3 },
];

describe('a batch', () => {
  it('stores every shape as it was typed, in the order in which runs were entered', async () => {
    const put = shapes.map((shape, index) => newRun(`R${9 - index}`, { shape, fittings: {} }));
    const { body } = await patch(put).expect(200);
    const stored = put.map((run) => ({ ...run, version: 1 }));
    expect(body).toEqual({ put: stored, dropped: [] });
    expect(await list()).toEqual(stored);
    // 150 ft stays "150" "ft"
    expect(body.put[0].shape.length).toEqual({ value: 45.72, typed: { text: '150', unit: 'ft' } });
  });

  it('stores what departs from the specification, a hold, and nulls', async () => {
    const override: RunInput['override'] = {
      reason: 'Drawing M-401 note 4 shows 38 mm',
      state: {
        nature: 'hot',
        operating: typed('temperature', '180 °F'),
        lowest: typed('temperature', '60'),
        highest: typed('temperature', '95'),
      },
      layers: [{ materialId: 'std/cellular_glass', thickness: 'in:1.5', installed: null }],
      finishId: 'std/aluminium-sheet',
      vapourRetarder: 'none',
      codeExempt: 'Not heated with purchased energy',
    };
    const hold = { reason: 'Old lagging: tested first', by: 'Olive Owner' };
    const put = [newRun('R01', { override, status: 'on-hold', hold, drawingId: null, elevation: null })];
    await patch(put).expect(200);
    expect(await list()).toEqual([{ ...put[0], version: 1 }]);
  });

  it('puts, changes and drops in one go', async () => {
    const [one, two, three] = [newRun('R01'), newRun('R02'), newRun('R03')];
    await patch([one, two]).expect(200);
    const changed = { ...one, version: 1, title: 'Changed', status: 'assumed' as const };
    const { body } = await patch([changed, three], [{ id: two.id, version: 1 }]).expect(200);
    expect(body).toEqual({
      put: [
        { ...changed, version: 2 },
        { ...three, version: 1 },
      ],
      dropped: [two.id],
    });
    expect((await list()).map(({ number }) => number)).toEqual(['R01', 'R03']);
  });

  it('lets two runs exchange their numbers, and refuses one that is taken', async () => {
    const [one, two] = [newRun('R01'), newRun('R02')];
    await patch([one, two]).expect(200);
    await patch([
      { ...one, version: 1, number: 'R02' },
      { ...two, version: 1, number: 'R01' },
    ]).expect(200);
    const { body } = await patch([newRun('R03'), newRun('R01')]).expect(400);
    expect(body.fields).toEqual({ 'put.1.number': 'Another run of this job is R01' });
    expect(await list()).toHaveLength(2);
  });

  it('takes 500 runs and refuses 501', async () => {
    const put = Array.from({ length: 501 }, (_, index) => newRun(`R${index}`));
    expect((await patch(put).expect(400)).body.fields).toEqual({ put: 'At most 500 runs at once' });
    const mixed = await patch(
      put.slice(0, 499),
      [1, 2].map(() => ({ id: randomUUID(), version: 1 })),
    ).expect(400);
    expect(mixed.body.fields).toEqual({ put: 'At most 500 runs at once' });
    expect(await list()).toEqual([]);
    await patch(put.slice(0, 500)).expect(200);
    const stored = await list();
    expect(stored).toHaveLength(500);
    const again = stored.map((run) => ({ ...run, title: 'Again' }));
    const { body } = await patch(again).expect(200);
    expect(body.put).toEqual(again.map((run) => ({ ...run, version: 2 })));
  });
});

describe('a retry', () => {
  it('of the same put is answered with what is stored, and stores nothing twice', async () => {
    const put = [newRun('R01'), newRun('R02')];
    const first = await patch(put).expect(200);
    const second = await patch([...put, newRun('R03')]).expect(200);
    expect(second.body.put.slice(0, 2)).toEqual(first.body.put);
    expect(await list()).toHaveLength(3);
  });

  it('with other content under the same id is stale', async () => {
    const run = newRun('R01');
    await patch([run]).expect(200);
    const { body } = await patch([{ ...run, title: 'Another' }, newRun('R02')]).expect(409);
    expect(body).toMatchObject({ type: '/problems/stale', current: [{ ...run, version: 1 }] });
    expect(await list()).toHaveLength(1);
  });
});

describe('two people at once', () => {
  it('one edit of a version is stored, the other gets only the stale rows', async () => {
    const put = [newRun('R01'), newRun('R02')];
    await patch(put).expect(200);
    const edit = (title: string) => patch([{ ...put[0]!, version: 1, title }]);
    const answers = await Promise.all([edit('First'), edit('Second')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const [winner] = answers.filter(({ status }) => status === 200);
    const [loser] = answers.filter(({ status }) => status === 409);
    expect(loser!.body.current).toEqual(winner!.body.put);

    const both = put.map((run) => ({ ...run, version: 1, note: 'Both' }));
    const { body } = await patch(both).expect(409);
    expect(body.current).toEqual(winner!.body.put);
    expect((await list()).map(({ note }) => note)).toEqual(['Walked', 'Walked']);
    const drop = await patch([], [{ id: put[0]!.id, version: 1 }]).expect(409);
    expect(drop.body.current).toEqual(winner!.body.put);
  });

  it('two new runs of one number: one is stored', async () => {
    const answers = await Promise.all([patch([newRun('R01')]), patch([newRun('R01')])]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 400]);
    expect(await list()).toHaveLength(1);
  });

  it('a place is dropped while a run is put in it: one of the two is refused', async () => {
    const drop = agent.delete(`${made.path}/places/${made.place.id}?version=1`);
    const [dropped, put] = await Promise.all([drop, patch([newRun('R01')])]);
    expect([dropped.status, put.status]).toEqual(dropped.status === 204 ? [204, 400] : [409, 200]);
  });
});

it('is read by a foreman, written by nobody but owner and estimator', async () => {
  await patch([newRun('R01')]).expect(200);
  expect((await foreman.get(`${made.path}/runs`).expect(200)).body.runs).toHaveLength(1);
  await foreman
    .patch(`${made.path}/runs`)
    .send({ put: [newRun('R02')], drop: [] })
    .expect(403);
  expect(await list()).toHaveLength(1);
});

it('refuses an id that stands in another job of the firm, and lets another firm have the same', async () => {
  const run = newRun('R01');
  await patch([run]).expect(200);
  const other = await newJob(agent, { number: `RUN-${(jobs += 1)}` });
  const inOther = { ...run, ...other.where };
  const { body } = await agent
    .patch(`${other.path}/runs`)
    .send({ put: [inOther], drop: [] })
    .expect(400);
  expect(body.fields).toEqual({ 'put.0.id': 'Another job has a run with this id' });
  const stranger = await signedIn(stack, await newFirm(stack.services));
  const theirs = await newJob(stranger);
  await stranger
    .patch(`${theirs.path}/runs`)
    .send({ put: [{ ...run, ...theirs.where }], drop: [] })
    .expect(200);
  expect(await list()).toEqual([{ ...run, version: 1 }]);
});
