import type { Knex } from 'knex';
import { z } from 'zod';

const openedRow = z.object({
  state: z.enum(['current', 'superseded', 'expired', 'revoked']),
  superseded_by: z.string().nullable(),
  contact_name: z.string(),
  pdf_bytes: z.number().nullable(),
  snapshot: z.unknown(),
});
const pdfRow = z.object({
  number: z.string(),
  letter: z.string(),
  date: z.string(),
  hash: z.string(),
  bytes: z.instanceof(Buffer),
});

/** Who opens a link: nothing finer than this is kept. */
export type Opening = { tokenHash: Buffer; moment: Date; address: string; agent: string };

/** What a private link opens, found by its token's hash without a firm; each opening is recorded. */
export function createLinkDoors(db: Knex) {
  const ask = async (door: string, { tokenHash, moment, address, agent }: Opening) => {
    const values = [tokenHash, moment, address, agent];
    return (await db.raw<{ rows: unknown[] }>(`select * from ${door}(?, ?, ?, ?)`, values)).rows[0];
  };
  return {
    async open(opening: Opening) {
      const row = await ask('door_open_link', opening);
      return row === undefined ? undefined : openedRow.parse(row);
    },
    /** Undefined when there is no such link, or it was revoked or has expired. */
    async pdf(opening: Opening) {
      const row = await ask('door_link_pdf', opening);
      return row === undefined ? undefined : pdfRow.parse(row);
    },
  };
}
export type LinkDoors = ReturnType<typeof createLinkDoors>;
