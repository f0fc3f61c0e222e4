import type { Knex } from 'knex';

import { inJob, jobRow, shortText } from '../firm-rows';
import { putBehindFirm } from '../firm-wall';

/** With what a service is insulated, by place and size; and the same as an engineer handed it down. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('build_ups', (table) => covering(knex, table));
  await knex.schema.createTable('specification_rows', (table) => {
    covering(knex, table);
    shortText(table, 'label', 20);
    table.unique(['firm_id', 'job_id', 'label']);
  });
  for (const parent of ['build_ups', 'specification_rows']) {
    await knex.schema.createTable(`${parent}_places`, (table) => placesOf(table, parent));
  }
  for (const table of tables) await putBehindFirm(knex, table);
}

const tables = ['build_ups', 'specification_rows', 'build_ups_places', 'specification_rows_places'];

function covering(knex: Knex, table: Knex.CreateTableBuilder): void {
  jobRow(knex, table);
  table.uuid('service_id').notNullable();
  inJob(table, 'service_id', 'services');
  table.text('applies_to').notNullable().checkIn(['pipe', 'duct', 'equipment']);
  table.integer('from_dn').checkBetween([0, 5000]);
  table.integer('to_dn').checkBetween([0, 5000]);
  table.check('from_dn <= to_dn');
  table.jsonb('layers').notNullable();
  shortText(table, 'finish_id', 64);
  shortText(table, 'vapour_retarder', 40);
  shortText(table, 'note', 400);
}

function placesOf(table: Knex.CreateTableBuilder, parent: string): void {
  table.uuid('firm_id').notNullable();
  table.uuid('job_id').notNullable();
  table.uuid('row_id').notNullable();
  table.uuid('place_id').notNullable();
  table.integer('position').notNullable();
  table.primary(['firm_id', 'job_id', 'row_id', 'place_id']);
  const row = table.foreign(['firm_id', 'job_id', 'row_id']).references(['firm_id', 'job_id', 'id']).inTable(parent);
  row.onDelete('CASCADE');
  inJob(table, 'place_id', 'places');
}

export async function down(knex: Knex): Promise<void> {
  for (const table of [...tables].reverse()) await knex.schema.dropTable(table);
}
