import { randomBytes } from 'node:crypto';

import { connect } from '@/db/connection';

import type { Database } from './stack';

/** A migrated database for one test file alone; `drop` it in afterAll. */
export async function ownDatabase(): Promise<Database & { drop: () => Promise<void> }> {
  const base = process.env.OWNER_DATABASE_URL ?? '';
  const name = `test_${process.ppid}_${randomBytes(4).toString('hex')}`;
  const owner = connect(base, 1);
  await owner.raw('select pg_advisory_lock(7)');
  await owner.raw('create database ?? template ??', [name, process.env.TEMPLATE_DATABASE ?? '']);
  await owner.raw('select pg_advisory_unlock(7)');
  const at = (url: string) => Object.assign(new URL(url), { pathname: `/${name}` }).href;
  const drop = async () => {
    await owner.raw('drop database ?? with (force)', [name]);
    await owner.destroy();
  };
  return { url: at(process.env.DATABASE_URL ?? ''), ownerUrl: at(base), drop };
}
