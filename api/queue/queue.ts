import PgBoss from 'pg-boss';
import type { Logger } from 'pino';

/** The app role's pg-boss: it never installs or migrates. Only a worker keeps the queues in order. */
export async function startQueue(url: string, { works, logger }: { works: boolean; logger: Logger }): Promise<PgBoss> {
  const boss = new PgBoss({
    connectionString: url,
    max: works ? 4 : 1,
    migrate: false,
    supervise: works,
    schedule: false,
    maintenanceIntervalSeconds: 30,
    monitorStateIntervalSeconds: 30,
  });
  boss.on('error', (error) => logger.error(error, 'queue'));
  await boss.start();
  return boss;
}
