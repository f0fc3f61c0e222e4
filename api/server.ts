import path from 'node:path';
import { Pool } from 'pg';

import { createApp } from '@/api/app';
import { begin, giveUp } from '@/api/begin';
import type { Config } from '@/api/config';
import { createLogger, requestLogger } from '@/api/logger';
import { startQueue } from '@/api/queue/queue';
import { sessions } from '@/api/routes/middleware/session';
import { onStop } from '@/api/stop';
import { wireServices } from '@/api/wiring';
import { connect } from '@/db/connection';
import { createReadiness } from '@/db/readiness';

async function main(config: Config): Promise<void> {
  const { databaseUrl, host, port, publicUrl } = config;
  const logger = createLogger(config.logLevel);
  const db = connect(databaseUrl);
  const pool = new Pool({ connectionString: databaseUrl, max: 4 });
  pool.on('error', (error) => logger.error(error, 'sessions'));
  const boss = await startQueue(databaseUrl, { works: false, logger });
  const app = createApp({
    session: sessions({ pool, secret: config.sessionSecret, secure: config.secureCookies }),
    services: wireServices({ db, boss, config }),
    readiness: createReadiness(db),
    signInLimit: { tries: config.signInTries, minutes: 15 },
    publicUrl,
    logger: requestLogger(logger),
    web: config.webFolder && path.resolve(config.webFolder),
  });
  const server = app.listen(port, host, (error) => {
    if (error) giveUp(portTaken(error) ? new Error(`Port ${port} is in use: choose another with PORT.`) : error);
    logger.info({ host, port }, 'listening');
  });
  onStop(logger, async () => {
    // running requests finish first
    await new Promise((resolve) => {
      server.close(resolve);
      server.closeIdleConnections();
    });
    await boss.stop({ graceful: false });
    await Promise.all([db.destroy(), pool.end()]);
  });
}

const portTaken = (error: Error) => 'code' in error && error.code === 'EADDRINUSE';

begin(main);
