import type { Knex } from 'knex';

import { firmRow, shortText } from '../firm-rows';
import { putBehindFirm } from '../firm-wall';

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('jobs', (table) => {
    firmRow(knex, table);
    shortText(table, 'number', 24);
    table.unique(['firm_id', 'number']);
    shortText(table, 'name', 160);
    shortText(table, 'site', 160);
    shortText(table, 'scope', 2000);
    table.date('bid_due_date');
    table.text('bid_due_time').checkLength('<=', 5);
    table.text('bid_due_zone').checkLength('<=', 60);
    table.specificType('currency', 'char(3)').notNullable();
    shortText(table, 'code_edition', 60);
    shortText(table, 'climate_zone', 2);
    table.double('altitude').notNullable().checkBetween([-430, 6000]);
    table.jsonb('altitude_typed');
    table.text('document_units').notNullable().checkIn(['SI']);
    table.text('series_unit').notNullable().checkIn(['in', 'mm']);
    table.text('surface_method').notNullable().checkIn(['astm-c680', 'iso-12241']);
    shortText(table, 'specification_number', 60);
    shortText(table, 'specification_title', 160);
    shortText(table, 'specification_revision', 40);
    table.date('specification_date');
    table.check('num_nulls(bid_due_date, bid_due_time, bid_due_zone) in (0, 3)', undefined, 'bid_due_whole');
  });
  await knex.schema.createTable('job_contacts', (table) => {
    table.uuid('firm_id').notNullable();
    table.uuid('job_id').notNullable();
    table.uuid('contact_id').notNullable();
    table.integer('position').notNullable();
    table.primary(['firm_id', 'job_id', 'contact_id']);
    table.foreign(['firm_id', 'job_id']).references(['firm_id', 'id']).inTable('jobs').onDelete('CASCADE');
    table.foreign(['firm_id', 'contact_id']).references(['firm_id', 'id']).inTable('contacts');
    table.index(['firm_id', 'contact_id']);
  });
  for (const table of ['jobs', 'job_contacts']) await putBehindFirm(knex, table);
}

export async function down(knex: Knex): Promise<void> {
  for (const table of ['job_contacts', 'jobs']) await knex.schema.dropTable(table);
}
