import type PgBoss from 'pg-boss';
import { Pool } from 'pg';
import { pino } from 'pino';

import type { Clock } from '@/api/adapters/clock';
import { createApp, type AppParts } from '@/api/app';
import { startQueue } from '@/api/queue/queue';
import { sessions } from '@/api/routes/middleware/session';
import { wireServices } from '@/api/wiring';
import { connect } from '@/db/connection';
import { createReadiness } from '@/db/readiness';

/** The database that all test files of this run share; a file whose workers take jobs asks for one of its own. */
const shared: Database = { url: process.env.DATABASE_URL ?? '', ownerUrl: process.env.OWNER_DATABASE_URL ?? '' };
export const publicUrl = 'http://localhost:4000';

export type Stack = Awaited<ReturnType<typeof startStack>>;

export type Database = { url: string; ownerUrl: string };
type StackParts = Partial<AppParts> & { clock?: Clock; bcryptCost?: number; database?: Database };

/**
 * Services and app on this run's own database, as the server wires them; call `stop` in afterAll.
 * `owner` is the database's owner, for what the app's role must not do. bcrypt's least cost: tests sign in often.
 */
export async function startStack({ clock, bcryptCost = 4, database = shared, ...parts }: StackParts = {}) {
  const logger = pino({ level: 'silent' });
  const db = connect(database.url, 6);
  const owner = connect(database.ownerUrl, 2);
  const pool = new Pool({ connectionString: database.url, max: 2 });
  const boss: PgBoss = await startQueue(database.url, { works: false, logger });
  const services = wireServices({ db, boss, config: { bcryptCost, publicUrl }, clock });
  const app = createApp({
    session: sessions({ pool, secret: 'a secret of the tests', secure: false, prune: false }),
    services,
    readiness: createReadiness(db),
    signInLimit: { tries: 1000, minutes: 15 },
    publicUrl,
    ...parts,
  });
  const stop = async () => {
    await boss.stop({ graceful: false });
    await Promise.all([db.destroy(), owner.destroy(), pool.end()]);
  };
  return { app, boss, db, owner, services, stop };
}
