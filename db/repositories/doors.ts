import type { Knex } from 'knex';
import { z } from 'zod';

import type { FirmInput } from '@/api/contracts/session';

import { createLinkDoors } from './link-doors';

const signInRow = z.object({ account_id: z.uuid(), firm_id: z.uuid(), password_hash: z.string() });
const foundedRow = z.object({ account_id: z.uuid(), firm_id: z.uuid() });
const waitRow = z.object({ wait: z.number() });

type NewOwner = { name: string; email: string; passwordHash: string };
type Limit = { moment: Date; most: number; seconds: number };

/** The only queries without a firm: functions of the database's owner, each with one narrow answer. */
export function createDoors(db: Knex) {
  const ask = async (sql: string, values: readonly Knex.RawBinding[]) =>
    (await db.raw<{ rows: unknown[] }>(sql, values)).rows[0];
  return {
    link: createLinkDoors(db),
    async signIn(email: string) {
      const row = await ask('select * from door_sign_in(?)', [email]);
      return row === undefined ? undefined : signInRow.parse(row);
    },
    /** Gives undefined when the owner's address is taken. */
    async foundFirm(firm: FirmInput, { name, email, passwordHash }: NewOwner) {
      const row = await ask('select * from door_found_firm(?::jsonb, ?, ?, ?)', [
        JSON.stringify(firm),
        name,
        email,
        passwordHash,
      ]);
      if (row === undefined) return undefined;
      const founded = foundedRow.parse(row);
      return { firmId: founded.firm_id, accountId: founded.account_id };
    },
    /** Counts a try of `key`, shared by every server; gives the seconds to wait, 0 when it may go on. */
    async countTry(key: string, { moment, most, seconds }: Limit): Promise<number> {
      const row = await ask('select door_count_try(?, ?, ?, ?) as wait', [key, moment, most, seconds]);
      return waitRow.parse(row).wait;
    },
    async forgetTries(key: string): Promise<void> {
      await db.raw('select door_forget_tries(?)', [key]);
    },
  };
}
export type Doors = ReturnType<typeof createDoors>;
