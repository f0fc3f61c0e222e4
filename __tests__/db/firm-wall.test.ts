import type { Knex } from 'knex';
import { randomUUID } from 'node:crypto';

import { createWithFirm } from '@/db/with-firm';

import { newFirm, newMember } from '../support/firm';
import { startStack, type Stack } from '../support/stack';

let stack: Stack;
beforeAll(async () => {
  stack = await startStack();
});
afterAll(() => stack.stop());

const rowsOf = async (query: Knex.Raw): Promise<Record<string, unknown>[]> => (await query).rows;
/** SQL of the app's role in a transaction of this firm. */
const inFirm = (firmId: string, sql: string, values: readonly Knex.RawBinding[] = []) =>
  stack.db.transaction(async (transaction) => {
    await transaction.raw("select set_config('app.firm', ?, true)", [firmId]);
    return rowsOf(transaction.raw(sql, values));
  });
const denied = { code: '42501' };

describe('the role of the app', () => {
  it('owns nothing, and cannot pass row security', async () => {
    const [role] = await rowsOf(
      stack.db.raw(
        'select current_user as name, rolsuper, rolbypassrls, rolcreaterole, rolcreatedb from pg_roles where rolname = current_user',
      ),
    );
    expect(role).toEqual({
      name: 'thickset_app',
      rolsuper: false,
      rolbypassrls: false,
      rolcreaterole: false,
      rolcreatedb: false,
    });
    const owned = ['pg_class.relowner', 'pg_proc.proowner', 'pg_namespace.nspowner', 'pg_type.typowner'].map(
      (column) => {
        const [table] = column.split('.');
        return rowsOf(
          stack.db.raw(
            `select '${column}' as owned from ${table} where ${column} = (select oid from pg_roles where rolname = current_user)`,
          ),
        );
      },
    );
    expect((await Promise.all(owned)).flat()).toEqual([]);
    const memberOf =
      'select 1 from pg_auth_members m join pg_roles r on r.oid = m.member where r.rolname = current_user';
    expect(await rowsOf(stack.db.raw(memberOf))).toEqual([]);
  });

  it('can make no table, no function and no other role', async () => {
    await expect(stack.db.raw('create table planted (id int)')).rejects.toMatchObject(denied);
    await expect(
      stack.db.raw("create function planted() returns int language sql as 'select 1'"),
    ).rejects.toMatchObject(denied);
    await expect(stack.db.raw('create role planted')).rejects.toMatchObject(denied);
  });

  it.each(['accounts', 'tries'])('reaches no row of %s', async (table) => {
    await expect(stack.db(table)).rejects.toMatchObject(denied);
    await expect(stack.db(table).delete()).rejects.toMatchObject(denied);
  });

  it('cannot raise anybody’s rights', async () => {
    const { firmId } = await newFirm(stack.services);
    await expect(inFirm(firmId, "update memberships set role = 'owner'")).rejects.toMatchObject(denied);
    await expect(inFirm(firmId, 'update memberships set may_send = true')).rejects.toMatchObject(denied);
    await expect(inFirm(firmId, 'delete from memberships')).rejects.toMatchObject(denied);
  });
});

describe('every table', () => {
  const tables = `select c.relname as name, c.relrowsecurity as secured from pg_class c
    where c.relkind in ('r', 'p') and c.relnamespace = 'public'::regnamespace`;
  const withFirmId = `exists (select 1 from pg_attribute a where a.attrelid = c.oid and a.attname = 'firm_id' and not a.attisdropped)`;

  it('with a firm is secured, by one policy that looks at the firm for reading and writing', async () => {
    const rows = await rowsOf(
      stack.owner.raw(`select t.name, t.secured, p.polcmd as command, p.polpermissive as permissive,
          pg_get_expr(p.polqual, p.polrelid) as reads, pg_get_expr(p.polwithcheck, p.polrelid) as writes
        from (${tables} and (${withFirmId} or c.relname = 'firms')) t
        left join pg_policy p on p.polrelid = format('public.%I', t.name)::regclass`),
    );
    expect(rows.length).toBeGreaterThan(3);
    for (const { name, ...row } of rows) {
      const mine = `(${name === 'firms' ? 'id' : 'firm_id'} = (NULLIF(current_setting('app.firm'::text, true), ''::text))::uuid)`;
      expect({ name, ...row }).toEqual({
        name,
        secured: true,
        command: '*',
        permissive: true,
        reads: mine,
        writes: mine,
      });
    }
  });

  it('without a firm is one of a few, with a reason for each', async () => {
    const rows = await rowsOf(stack.owner.raw(`${tables} and not ${withFirmId}`));
    expect(rows.map(({ name }) => name).sort()).toEqual([
      'accounts', // beyond the app's reach
      'firms', // is the firm: secured by its id
      'knex_migrations', // read at the start
      'knex_migrations_lock', // the owner's
      'sessions', // by a random id that only the cookie knows
      'tries', // beyond the app's reach
    ]);
  });

  it('of one firm refers to others by firm and id, so that nothing hangs on another firm’s row', async () => {
    const loose = await rowsOf(
      stack.owner.raw(`select k.conrelid::regclass::text as child, k.conname as name from pg_constraint k
        join pg_class c on c.oid = k.conrelid join pg_class parent on parent.oid = k.confrelid
        where k.contype = 'f' and c.relnamespace = 'public'::regnamespace and ${withFirmId}
          and exists (select 1 from pg_attribute a where a.attrelid = parent.oid and a.attname = 'firm_id' and not a.attisdropped)
          and not exists (select 1 from pg_attribute a where a.attrelid = c.oid and a.attname = 'firm_id' and a.attnum = any (k.conkey))`),
    );
    expect(loose).toEqual([]);
  });
});

describe('a firm', () => {
  it('sees its own people and itself only, and without a firm there is nothing', async () => {
    const [ours, theirs] = [await newFirm(stack.services), await newFirm(stack.services)];
    await newMember(stack.services, ours, { role: 'foreman' });
    expect(await inFirm(ours.firmId, 'select distinct firm_id from members')).toEqual([{ firm_id: ours.firmId }]);
    expect(await inFirm(ours.firmId, 'select account_id from members where firm_id = ?', [theirs.firmId])).toEqual([]);
    expect(await inFirm(ours.firmId, 'select id from firms')).toEqual([{ id: ours.firmId }]);
    for (const table of ['firms', 'members', 'jobs']) expect(await stack.db(table)).toEqual([]);
    expect(await inFirm(randomUUID(), 'select * from members')).toEqual([]);
    await expect(inFirm("' or true --", 'select * from members')).rejects.toMatchObject({ code: '22P02' });
  });

  it('changes nobody else’s units', async () => {
    const [ours, theirs] = [await newFirm(stack.services), await newFirm(stack.services)];
    const sql = "update memberships set units = 'IP' where account_id = ? returning account_id";
    expect(await inFirm(ours.firmId, sql, [theirs.accountId])).toEqual([]);
  });

  it('gets one more person only where the transaction says so', async () => {
    const add = "select door_add_member('Eve', ?, 'x', 'owner', true, true) as id";
    await expect(stack.db.raw(add, ['eve-1@nowhere.example'])).rejects.toThrow();
    expect(await inFirm(randomUUID(), add, ['eve-2@nowhere.example'])).toEqual([{ id: null }]);
  });
});

describe('one transaction', () => {
  it('takes everything back when the work throws, the queue’s job with it', async () => {
    const { firmId } = await newFirm(stack.services);
    const withFirm = createWithFirm(stack);
    const job = { firmId, revisionId: randomUUID() };
    const waiting = () =>
      rowsOf(stack.db.raw("select id from pgboss.job where data->>'revisionId' = ?", [job.revisionId]));
    const work = async (fails: boolean) =>
      withFirm(firmId, async ({ members, enqueue }) => {
        const person = { name: 'Half', email: `${job.revisionId}@nowhere.example`, passwordHash: 'x' };
        await members.add({ ...person, role: 'foreman', maySend: false, seesMargin: false });
        await enqueue('render', job);
        if (fails) throw new Error('no');
      });
    await expect(work(true)).rejects.toThrow('no');
    expect(await waiting()).toEqual([]);
    expect(await withFirm(firmId, ({ members }) => members.list())).toHaveLength(1);
    await work(false);
    expect(await waiting()).toHaveLength(1);
    expect(await withFirm(firmId, ({ members }) => members.list())).toHaveLength(2);
  });
});

describe('an owner only', () => {
  it('adds people, and no address twice, in whatever case', async () => {
    const owner = await newFirm(stack.services);
    const estimator = await newMember(stack.services, owner, { role: 'estimator' });
    await expect(newMember(stack.services, estimator, { role: 'owner' })).rejects.toMatchObject({
      type: 'not-allowed',
    });
    const twice = {
      name: 'Twice',
      email: estimator.email.toUpperCase(),
      role: 'foreman',
      maySend: false,
      seesMargin: false,
    } as const;
    const added = stack.services.member.addMember(owner, { ...twice, password: 'a long password of the tests' });
    await expect(added).rejects.toMatchObject({ type: 'conflict' });
  });
});
