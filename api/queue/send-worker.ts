import type PgBoss from 'pg-boss';
import type { Logger } from 'pino';

import type { DeliveryService } from '@/api/services/delivery-service';

import { workOn } from './work';

type Parts = { boss: PgBoss; logger: Logger; delivery: DeliveryService };

/** Hands each message to the mail server. What is to be tried again is queued by the delivery itself, with its record. */
export const workOnSending = ({ boss, logger, delivery }: Parts): Promise<string> =>
  workOn({ boss, logger, name: 'send', handle: (job) => delivery.deliver(job) });
