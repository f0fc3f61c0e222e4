import type { Knex } from 'knex';

import { jobRow, shortText } from '../firm-rows';
import { putBehindFirm } from '../firm-wall';

/** What a takeoff is based on. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('levels', (table) => {
    jobRow(knex, table);
    shortText(table, 'name', 80);
    table.unique(['firm_id', 'job_id', 'name']);
    table.integer('position').notNullable().checkBetween([0, 999]);
  });
  await knex.schema.createTable('drawings', (table) => {
    jobRow(knex, table);
    shortText(table, 'number', 40);
    table.unique(['firm_id', 'job_id', 'number']);
    shortText(table, 'title', 120);
    shortText(table, 'revision', 20);
    table.date('date');
    shortText(table, 'scale', 40);
  });
  await knex.schema.createTable('addenda', (table) => {
    jobRow(knex, table);
    table.integer('number').notNullable().checkBetween([1, 999]);
    table.unique(['firm_id', 'job_id', 'number']);
    table.date('date').notNullable();
    shortText(table, 'changes', 2000);
    table.boolean('acknowledged').notNullable();
  });
  for (const table of ['levels', 'drawings', 'addenda']) await putBehindFirm(knex, table);
}

export async function down(knex: Knex): Promise<void> {
  for (const table of ['addenda', 'drawings', 'levels']) await knex.schema.dropTable(table);
}
