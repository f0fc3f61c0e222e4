// The demo, once: does nothing when its firm is there. Prints who can sign in, a line each.
import { systemClock } from '@/api/adapters/clock';
import { readConfig } from '@/api/config';
import { createLogger } from '@/api/logger';
import { startQueue } from '@/api/queue/queue';
import { wireServices } from '@/api/wiring';
import { connect } from '@/db/connection';
import { createDoors } from '@/db/repositories/doors';
import { demoOwner, seedDemo } from '@/db/seeds/demo';
import { createWithFirm } from '@/db/with-firm';

async function main(): Promise<void> {
  const config = readConfig(process.env);
  const password = process.env.DEMO_PASSWORD;
  if (!config.demo || !password) throw new Error('The demo is loaded only with DEMO=on and a DEMO_PASSWORD.');
  const db = connect(config.databaseUrl, 4);
  const boss = await startQueue(config.databaseUrl, { works: false, logger: createLogger(config.logLevel) });
  try {
    const found = await createDoors(db).signIn(demoOwner.email);
    if (!found) await seedDemo({ services: wireServices({ db, boss, config }), clock: systemClock, password });
    const firm = found ?? (await createDoors(db).signIn(demoOwner.email));
    if (!firm) throw new Error('The demo has no owner');
    const people = await createWithFirm({ db, boss })(firm.firm_id, ({ members }) => members.list());
    for (const { email, role, maySend } of people) {
      console.log(`${email}  ${role}${role === 'estimator' ? (maySend ? ', may send' : ', may not send') : ''}`);
    }
  } finally {
    await boss.stop({ graceful: false });
    await db.destroy();
  }
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
