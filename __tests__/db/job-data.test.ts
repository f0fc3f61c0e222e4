import { randomUUID } from 'node:crypto';

import type { Member } from '@/api/contracts/session';
import { jobDataSchema } from '@/api/contracts/job-data';
import { createRepositories } from '@/db/repositories/repositories';

import { newFirm, signedIn } from '../support/firm';
import { newJob, type Agent, type TestJob } from '../support/job';
import { addendumInput, buildUpInput, contactInput, runInput, specificationInput } from '../support/job-inputs';
import { startStack, type Stack } from '../support/stack';

let stack: Stack;
let owner: Member;
let agent: Agent;
let made: TestJob;
beforeAll(async () => {
  stack = await startStack();
  owner = await newFirm(stack.services);
  agent = await signedIn(stack, owner);
  const { body: contact } = await agent.post('/api/contacts').send(contactInput).expect(201);
  made = await newJob(agent, { contactIds: [contact.id] });
  const { path, service, place, where } = made;
  await agent.post(`${path}/addenda`).send(addendumInput).expect(201);
  for (const placeIds of [[place.id], []]) {
    await agent
      .post(`${path}/build-ups`)
      .send({ ...buildUpInput(service.id), placeIds })
      .expect(201);
  }
  await agent.post(`${path}/specification`).send(specificationInput(service.id)).expect(201);
  const put = Array.from({ length: 300 }, (_, index) => ({
    ...runInput(where, `R${index}`),
    id: randomUUID(),
    version: null,
  }));
  await agent.patch(`${path}/runs`).send({ put, drop: [] }).expect(200);
});
afterAll(() => stack.stop());

/** Loads the job in a transaction of its own, counting what is asked of the database. */
async function load(jobId: string) {
  const queries: string[] = [];
  const count = ({ sql }: { sql: string }) => queries.push(sql);
  const data = await stack.db.transaction(async (transaction) => {
    await transaction.raw("select set_config('app.firm', ?, true)", [owner.firmId]);
    transaction.on('query', count);
    return createRepositories(transaction, owner.firmId).jobData.load(jobId);
  });
  return { data, queries };
}

it('loads a job of 300 runs in one query for each table', async () => {
  const { data, queries } = await load(made.job.id);
  expect(jobDataSchema.parse(data)).toEqual(data);
  expect(data?.runs).toHaveLength(300);
  expect(queries.length).toBeLessThanOrEqual(14);
});

it('gives the same rows as the routes do', async () => {
  const { data } = await load(made.job.id);
  const read = async (noun: string) => (await agent.get(`${made.path}/${noun}`).expect(200)).body;
  expect(data).toEqual({
    job: (await agent.get(made.path).expect(200)).body,
    levels: await read('levels'),
    drawings: await read('drawings'),
    addenda: await read('addenda'),
    places: await read('places'),
    services: await read('services'),
    buildUps: await read('build-ups'),
    specification: await read('specification'),
    runs: (await read('runs')).runs,
    contacts: (await agent.get('/api/contacts').expect(200)).body,
  });
  expect(data?.buildUps.map(({ placeIds }) => placeIds)).toEqual([[made.place.id], []]);
});

it('knows no job of another firm', async () => {
  const theirs = await newJob(await signedIn(stack, await newFirm(stack.services)));
  expect((await load(theirs.job.id)).data).toBeUndefined();
  expect((await load(randomUUID())).data).toBeUndefined();
});

describe('the database itself', () => {
  const insideFirm = (statement: string, values: string[]) =>
    stack.db.transaction(async (transaction) => {
      await transaction.raw("select set_config('app.firm', ?, true)", [owner.firmId]);
      await transaction.raw(statement, values);
    });

  it('hangs no run on a row of another job of the same firm', async () => {
    const other = await newJob(agent, { number: 'TST-002' });
    for (const [column, id] of Object.entries({ place_id: other.place.id, service_id: other.service.id })) {
      const change = insideFirm(`update runs set ${column} = ? where job_id = ?`, [id, made.job.id]);
      await expect(change).rejects.toMatchObject({ code: '23503' });
    }
  });

  it.each([
    ['a text that is too long', "update jobs set name = repeat('x', 161)", '23514'],
    ['a hold without its reason', "update runs set status = 'on-hold'", '23514'],
    ['a status that does not exist', "update runs set status = 'lost'", '23514'],
    ['half a bid', 'update jobs set bid_due_zone = null', '23514'],
    ['two runs of one number', "update runs set number = 'R1'", '23505'],
  ])('keeps out %s', async (_what, statement, code) => {
    const change = insideFirm(`${statement} where firm_id = ?`, [owner.firmId]);
    await expect(change).rejects.toMatchObject({ code });
  });
});
