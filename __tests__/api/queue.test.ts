import { randomUUID } from 'node:crypto';
import { pino } from 'pino';

import { startQueue } from '@/api/queue/queue';
import { workOn } from '@/api/queue/work';

import { ownDatabase } from '../support/own-database';
import { startStack, type Stack } from '../support/stack';

const logger = pino({ level: 'silent' });
let database: Awaited<ReturnType<typeof ownDatabase>>;
let stack: Stack;
beforeAll(async () => {
  database = await ownDatabase();
  stack = await startStack({ database });
});
afterAll(async () => {
  await stack.stop();
  await database.drop();
});

const newJob = () => ({ firmId: randomUUID(), revisionId: randomUUID() });
const stateOf = async (id: string | null) => {
  const { rows } = await stack.db.raw('select state from pgboss.job where id = ?', [id]);
  return rows[0]?.state;
};
async function until(reached: () => Promise<boolean> | boolean) {
  for (let tries = 0; tries < 150 && !(await reached()); tries += 1) await new Promise((done) => setTimeout(done, 100));
}
const worker = () => startQueue(database.url, { works: true, logger });

it('works a job once, and gives it again when the work failed', async () => {
  const boss = await worker();
  const seen: unknown[] = [];
  const job = newJob();
  const id = await boss.send('render', job, { retryDelay: 1, retryBackoff: false });
  await workOn({
    boss,
    logger,
    name: 'render',
    handle: async (given) => {
      seen.push(given);
      if (seen.length === 1) throw new Error('not this time');
    },
  });
  await until(async () => (await stateOf(id)) === 'completed');
  expect(seen).toEqual([job, job]);
  await boss.stop({ graceful: false });
});

it('takes no job that is not of its shape', async () => {
  const boss = await worker();
  const handle = jest.fn(async () => undefined);
  const id = await boss.send('send', { firmId: "' or true", messageId: 1 }, { retryLimit: 0 });
  await workOn({ boss, logger, name: 'send', handle });
  await until(async () => (await stateOf(id)) === 'failed');
  expect(await stateOf(id)).toBe('failed');
  expect(handle).not.toHaveBeenCalled();
  await boss.stop({ graceful: false });
});

it('puts work that a stop cuts off back into the queue, for the next worker', async () => {
  const cut = await worker();
  const job = newJob();
  const id = await cut.send('render', job, { retryDelay: 1, retryBackoff: false });
  let begun = false;
  let finish = (): void => undefined;
  const endless = new Promise<void>((resolve) => {
    finish = resolve;
  });
  await workOn({
    boss: cut,
    logger,
    name: 'render',
    handle: () => {
      begun = true;
      return endless;
    },
  });
  await until(() => begun);
  await cut.stop({ graceful: true, timeout: 1000 });
  expect(await stateOf(id)).toBe('retry');
  finish();

  const next = await worker();
  const done: unknown[] = [];
  await workOn({ boss: next, logger, name: 'render', handle: async (given) => void done.push(given) });
  await until(async () => (await stateOf(id)) === 'completed');
  expect(done).toEqual([job]);
  await next.stop({ graceful: false });
});
