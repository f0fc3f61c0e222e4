import type { Knex } from 'knex';

import { jobRow, shortText } from '../firm-rows';
import { putBehindFirm } from '../firm-wall';

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('places', (table) => {
    jobRow(knex, table);
    shortText(table, 'name', 80);
    table.unique(['firm_id', 'job_id', 'name']);
    table.text('reach').notNullable().checkIn(['nobody', 'trained', 'public']);
    table.double('touch_limit').checkBetween([30, 100]);
    table.jsonb('touch_limit_typed');
    shortText(table, 'touch_limit_source', 200);
    table.boolean('outdoor').notNullable();
    table.boolean('plenum').notNullable();
    table.text('duct_location').checkLength('<=', 60);
    shortText(table, 'note', 400);
    table.jsonb('conditions').notNullable();
  });
  await knex.schema.createTable('services', (table) => {
    jobRow(knex, table);
    shortText(table, 'name', 80);
    table.unique(['firm_id', 'job_id', 'name']);
    shortText(table, 'fluid', 60);
    table.jsonb('states').notNullable();
    table.double('hours').notNullable().checkBetween([0, 8784]);
    table.jsonb('hours_typed');
    shortText(table, 'code_exempt', 200);
    table.jsonb('limits').notNullable();
    shortText(table, 'note', 400);
    table.integer('position').notNullable().checkBetween([0, 999]);
  });
  for (const table of ['places', 'services']) await putBehindFirm(knex, table);
}

export async function down(knex: Knex): Promise<void> {
  for (const table of ['services', 'places']) await knex.schema.dropTable(table);
}
