import { createSmtp } from '@/api/adapters/smtp';
import { startQueue } from '@/api/queue/queue';
import { createDeliveryService } from '@/api/services/delivery-service';
import { connect } from '@/db/connection';
import { createWithFirm, type WithFirm } from '@/db/with-firm';
import { pino } from 'pino';
import { z } from 'zod';

/** A worker that has the server's answer and dies before it can record it; started by a test that kills it. */
const given = z.object({
  DATABASE_URL: z.string(),
  SMTP_PORT: z.coerce.number(),
  FIRM: z.uuid(),
  MESSAGE: z.uuid(),
});

async function main(): Promise<void> {
  const { DATABASE_URL, SMTP_PORT, FIRM, MESSAGE } = given.parse(process.env);
  const logger = pino({ level: 'silent' });
  const db = connect(DATABASE_URL, 2);
  const boss = await startQueue(DATABASE_URL, { works: false, logger });
  const withFirm = createWithFirm({ db, boss });
  let claimed = false;
  const untilAnswered: WithFirm = (firmId, work) => {
    if (!claimed) {
      claimed = true;
      return withFirm(firmId, work);
    }
    process.send?.('answered');
    return new Promise(() => undefined);
  };
  const delivery = createDeliveryService({
    withFirm: untilAnswered,
    clock: () => new Date(),
    smtp: createSmtp({ host: '127.0.0.1', port: SMTP_PORT, secure: false }),
    settings: { publicUrl: 'http://localhost:4000', mailFrom: 'thickset@localhost' },
  });
  await delivery.deliver({ firmId: FIRM, messageId: MESSAGE });
}

void main();
