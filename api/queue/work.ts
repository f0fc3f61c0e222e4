import type PgBoss from 'pg-boss';
import type { Logger } from 'pino';

import { queueJobs, type QueueJob, type QueueName } from '@/db/queues';

type WorkParts<Name extends QueueName> = {
  boss: PgBoss;
  logger: Logger;
  name: Name;
  handle: (job: QueueJob<Name>) => Promise<void>;
};

/** Works one queue, a job at a time. A handler that throws gets the job again, later and later, as the queue's options say. */
export function workOn<Name extends QueueName>({ boss, logger, name, handle }: WorkParts<Name>): Promise<string> {
  const schema = queueJobs[name];
  return boss.work<unknown>(name, { pollingIntervalSeconds: 0.5, batchSize: 1 }, async (jobs) => {
    for (const { id, data } of jobs) {
      try {
        await handle(schema.parse(data));
        logger.info({ queue: name, job: id }, 'done');
      } catch (error) {
        logger.error({ queue: name, job: id, err: error }, 'failed');
        throw error;
      }
    }
  });
}
