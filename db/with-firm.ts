import type { Knex } from 'knex';
import type PgBoss from 'pg-boss';

import type { QueueJob, QueueName } from '@/db/queues';
import { createRepositories, type Repositories } from '@/db/repositories/repositories';

/** `after`: seconds until a worker may take the job. */
type When = { after?: number };
/** Puts a job in a queue on the transaction's own connection: a rollback drops it, a commit keeps it. */
export type Enqueue = <Name extends QueueName>(name: Name, job: QueueJob<Name>, when?: When) => Promise<void>;
export type Behind = Repositories & { enqueue: Enqueue };
export type WithFirm = <Result>(firmId: string, work: (behind: Behind) => Promise<Result>) => Promise<Result>;

/** One transaction in which only this firm's rows exist. Never render, mail or wait for a network inside it. */
export function createWithFirm({ db, boss }: { db: Knex; boss: PgBoss }): WithFirm {
  return (firmId, work) =>
    db.transaction(async (transaction) => {
      await transaction.raw("select set_config('app.firm', ?, true)", [firmId]);
      return work({ ...createRepositories(transaction, firmId), enqueue: enqueueOn(boss, transaction) });
    });
}

function enqueueOn(boss: PgBoss, transaction: Knex.Transaction): Enqueue {
  const executeSql = (text: string, values: unknown[]) => query(transaction, text, values);
  return async (name, job, { after = 0 } = {}) => {
    const id = await boss.send(name, job, { db: { executeSql }, startAfter: after });
    if (!id) throw new Error(`The queue ${name} took no job`);
  };
}

type PgConnection = { query(text: string, values: unknown[]): Promise<{ rows: unknown[] }> };

async function query(transaction: Knex.Transaction, text: string, values: unknown[]) {
  const connection: PgConnection = await transaction.client.acquireConnection();
  return connection.query(text, values);
}
