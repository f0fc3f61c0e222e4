// The demo: enters what is not there yet. Prints who can sign in, a line each.
import { systemClock } from '@/api/adapters/clock';
import { readConfig } from '@/api/config';
import { roles } from '@/api/contracts/permission';
import type { Member } from '@/api/contracts/session';
import { createLogger } from '@/api/logger';
import { startQueue } from '@/api/queue/queue';
import type { Services } from '@/api/services/services';
import { wireServices, wireTogether } from '@/api/wiring';
import { connect } from '@/db/connection';
import { createDoors, type Doors } from '@/db/repositories/doors';
import { seedDemo } from '@/db/seeds/demo';
import { demoOwner } from '@/db/seeds/demo/people';

async function main(): Promise<void> {
  const config = readConfig(process.env);
  const password = process.env.DEMO_PASSWORD;
  if (!config.demo || !password) throw new Error('The demo is loaded only with DEMO=on and a DEMO_PASSWORD.');
  const db = connect(config.databaseUrl, 4);
  const boss = await startQueue(config.databaseUrl, { works: false, logger: createLogger(config.logLevel) });
  const parts = { db, boss, config };
  const { member, session } = wireServices(parts);
  const findOwner = () => find(createDoors(db), session);
  try {
    const owner = await findOwner();
    await seedDemo({ owner, member, together: wireTogether(parts), clock: systemClock, password }).finally(async () => {
      const founded = owner ?? (await findOwner());
      if (founded) (await member.list(founded)).sort(byRole).forEach((person) => console.log(describe(person)));
    });
  } finally {
    await boss.stop({ graceful: false });
    await db.destroy();
  }
}

async function find(doors: Doors, session: Services['session']): Promise<Member | undefined> {
  const account = await doors.signIn(demoOwner.email);
  return account && session.member(account.firm_id, account.account_id);
}

const byRole = (a: Member, b: Member) => roles.indexOf(a.role) - roles.indexOf(b.role);

const describe = ({ email, role, maySend }: Member) =>
  `${email.padEnd(40)}${role}${role === 'estimator' ? `, ${maySend ? 'may' : 'may not'} send` : ''}`;

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
