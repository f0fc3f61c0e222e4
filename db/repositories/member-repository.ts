import type { Knex } from 'knex';

import type { Role } from '@/api/contracts/permission';
import type { UnitSystem } from '@/api/contracts/quantities';
import type { Member, MemberInput } from '@/api/contracts/session';

type MemberRow = {
  account_id: string;
  firm_id: string;
  name: string;
  email: string;
  role: Role;
  may_send: boolean;
  sees_margin: boolean;
  units: UnitSystem;
};
type NewMember = Omit<MemberInput, 'password'> & { passwordHash: string };

/** A firm's people: read through the view `members`; accounts stay out of the app's reach. */
export function createMemberRepository(transaction: Knex.Transaction, firmId: string) {
  const members = () => transaction<MemberRow>('members').where({ firm_id: firmId });
  return {
    list: async () => (await members().orderBy('name')).map(toMember),
    async find(accountId: string): Promise<Member | undefined> {
      const row = await members().where({ account_id: accountId }).first();
      return row && toMember(row);
    },
    /** Adds an account and its place in this transaction's firm; gives undefined when the address is taken. */
    async add({ name, email, role, maySend, seesMargin, passwordHash }: NewMember): Promise<string | undefined> {
      const { rows } = await transaction.raw<{ rows: { account_id: string | null }[] }>(
        'select door_add_member(?, ?, ?, ?, ?, ?) as account_id',
        [name, email, passwordHash, role, maySend, seesMargin],
      );
      return rows[0]?.account_id ?? undefined;
    },
    async setUnits(accountId: string, units: UnitSystem): Promise<void> {
      await transaction('memberships').where({ firm_id: firmId, account_id: accountId }).update({ units });
    },
  };
}
export type MemberRepository = ReturnType<typeof createMemberRepository>;

const toMember = (row: MemberRow): Member => ({
  accountId: row.account_id,
  firmId: row.firm_id,
  name: row.name,
  email: row.email,
  role: row.role,
  maySend: row.may_send,
  seesMargin: row.sees_margin,
  units: row.units,
});
