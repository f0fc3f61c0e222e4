import { systemClock } from '@/api/adapters/clock';
import { createSmtp } from '@/api/adapters/smtp';
import { begin } from '@/api/begin';
import type { Config } from '@/api/config';
import { createLogger } from '@/api/logger';
import { startQueue } from '@/api/queue/queue';
import { workOnRendering } from '@/api/queue/render-worker';
import { workOnSending } from '@/api/queue/send-worker';
import { createDeliveryService } from '@/api/services/delivery-service';
import { createRenderingService } from '@/api/services/rendering-service';
import { onStop } from '@/api/stop';
import { connect } from '@/db/connection';
import { createWithFirm } from '@/db/with-firm';

async function main(config: Config): Promise<void> {
  const logger = createLogger(config.logLevel);
  const db = connect(config.databaseUrl, 4);
  const boss = await startQueue(config.databaseUrl, { works: true, logger });
  const withFirm = createWithFirm({ db, boss });
  const { publicUrl, mailFrom, smtp: server } = config;
  const settings = { publicUrl, mailFrom };
  const delivery = createDeliveryService({ withFirm, clock: systemClock, smtp: createSmtp(server), settings });
  await workOnRendering({ boss, logger, rendering: createRenderingService({ withFirm }) });
  await workOnSending({ boss, logger, delivery });
  logger.info('working');
  onStop(logger, async () => {
    // work that does not finish goes back to its queue
    await boss.stop({ graceful: true, timeout: 5000 });
    await db.destroy();
  });
}

begin(main);
