import type { Knex } from 'knex';

import { firmRow, shortText } from '../firm-rows';
import { putBehindFirm } from '../firm-wall';

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('contacts', (table) => {
    firmRow(knex, table);
    shortText(table, 'name', 120);
    shortText(table, 'company', 160);
    shortText(table, 'email', 254);
    shortText(table, 'role', 120);
  });
  await putBehindFirm(knex, 'contacts');
}

export const down = (knex: Knex) => knex.schema.dropTable('contacts');
