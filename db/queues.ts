import type { Knex } from 'knex';
import PgBoss from 'pg-boss';
import { z } from 'zod';

/** What each queue's jobs carry: ids only, the work reads its own data behind the firm's wall. */
type QueueJobs = {
  render: { firmId: string; revisionId: string };
  send: { firmId: string; messageId: string };
};
export type QueueName = keyof QueueJobs;
export type QueueJob<Name extends QueueName> = QueueJobs[Name];

export const queueNames = ['render', 'send'] as const satisfies readonly QueueName[];
export const queueJobs: { [Name in QueueName]: z.ZodType<QueueJobs[Name]> } = {
  render: z.object({ firmId: z.uuid(), revisionId: z.uuid() }),
  send: z.object({ firmId: z.uuid(), messageId: z.uuid() }),
};

/** A job whose worker died is taken up again after `expireInSeconds`. */
const options = { retryLimit: 8, retryDelay: 2, retryBackoff: true, expireInSeconds: 120 };

/** The owner installs pg-boss and its queues; the app role may then only use them. A new queue needs a new run of this. */
export async function installQueues(ownerUrl: string, owner: Knex): Promise<void> {
  const boss = new PgBoss({ connectionString: ownerUrl, max: 2, supervise: false, schedule: false });
  boss.on('error', (error) => {
    throw error;
  });
  await boss.start();
  for (const name of queueNames) {
    await boss.createQueue(name, { name, ...options });
    await boss.updateQueue(name, { name, ...options });
  }
  await boss.stop({ graceful: false });
  await owner.raw(`
    grant usage on schema pgboss to thickset_app;
    grant select, insert, update, delete on all tables in schema pgboss to thickset_app;
    grant execute on all functions in schema pgboss to thickset_app;
  `);
}
