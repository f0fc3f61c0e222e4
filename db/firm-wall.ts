import type { Knex } from 'knex';

const firmOfTransaction = "nullif(current_setting('app.firm', true), '')::uuid";

/** Puts a table behind its firm: only rows of the transaction's `app.firm` exist for the app role. */
export async function putBehindFirm(
  knex: Knex,
  table: string,
  { column = 'firm_id', grant = 'select, insert, update, delete' } = {},
): Promise<void> {
  const mine = `${column} = ${firmOfTransaction}`;
  await knex.raw('alter table ?? enable row level security', [table]);
  await knex.raw(`create policy firm on ?? using (${mine}) with check (${mine})`, [table]);
  await knex.raw(`grant ${grant} on ?? to thickset_app`, [table]);
}
