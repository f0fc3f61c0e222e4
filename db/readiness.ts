import type { Knex } from 'knex';
import fs from 'node:fs';
import path from 'node:path';

import { queueNames } from './queues';

const migrations = fs.readdirSync(path.join(__dirname, 'migrations')).filter((file) => file.endsWith('.ts'));

/** Whether the database answers, has exactly this checkout's migrations, and has the queues. */
export function createReadiness(db: Knex) {
  const names = async (sql: string) => (await db.raw<{ rows: { name: string }[] }>(sql)).rows.map(({ name }) => name);
  const holds = (check: () => Promise<boolean>) => check().catch(() => false);
  return async () => ({
    database: await holds(async () => (await names('select 1 as name')).length === 1),
    migrations: await holds(async () => {
      const done = await names('select name from knex_migrations');
      return done.length === migrations.length && migrations.every((name) => done.includes(name));
    }),
    queue: await holds(async () => {
      const queues = await names('select name from pgboss.queue');
      return queueNames.every((name) => queues.includes(name));
    }),
  });
}
