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

export const databaseUrl = process.env.DATABASE_URL ?? '';
const ownerUrl = process.env.OWNER_DATABASE_URL ?? '';
export const publicUrl = 'http://localhost:4000';

export type Stack = Awaited<ReturnType<typeof startStack>>;

type StackParts = Partial<AppParts> & { clock?: Clock; bcryptCost?: number };

/**
 * Services and app on this run's own database, as the server wires them; call `stop` in afterAll.
 * `owner` is the database's owner, for what the app's role must not do. bcrypt's least cost: tests sign in often.
 */
export async function startStack({ clock, bcryptCost = 4, ...parts }: StackParts = {}) {
  const logger = pino({ level: 'silent' });
  const db = connect(databaseUrl, 6);
  const owner = connect(ownerUrl, 2);
  const pool = new Pool({ connectionString: databaseUrl, max: 2 });
  const boss: PgBoss = await startQueue(databaseUrl, { works: false, logger });
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
