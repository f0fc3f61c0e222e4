import { readConfig, type Config } from '@/api/config';
import { createLogger } from '@/api/logger';
import { startQueue } from '@/api/queue/queue';
import { onStop } from '@/api/stop';
import { connect } from '@/db/connection';

async function main(config: Config): Promise<void> {
  const logger = createLogger(config.logLevel);
  const db = connect(config.databaseUrl, 4);
  const boss = await startQueue(config.databaseUrl, { works: true, logger });
  logger.info('working');
  onStop(logger, async () => {
    // work that does not finish goes back to its queue
    await boss.stop({ graceful: true, timeout: 5000 });
    await db.destroy();
  });
}

function fail(error: unknown): never {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
}

try {
  main(readConfig(process.env)).catch(fail);
} catch (error) {
  fail(error);
}
