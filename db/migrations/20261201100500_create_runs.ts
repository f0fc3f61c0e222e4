import type { Knex } from 'knex';

import { inJob, jobRow, shortText } from '../firm-rows';
import { putBehindFirm } from '../firm-wall';

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('runs', (table) => {
    jobRow(knex, table);
    shortText(table, 'number', 20);
    shortText(table, 'title', 120);
    for (const parent of ['service', 'place', 'level']) {
      table.uuid(`${parent}_id`).notNullable();
      inJob(table, `${parent}_id`, `${parent}s`);
    }
    table.uuid('drawing_id');
    inJob(table, 'drawing_id', 'drawings');
    table.jsonb('shape').notNullable();
    table.double('elevation').checkBetween([-500, 1000]);
    table.jsonb('elevation_typed');
    table.jsonb('fittings').notNullable();
    table.text('status').notNullable().checkIn(['measured', 'assumed', 'by-others', 'on-hold']);
    table.jsonb('hold');
    table.check("(status = 'on-hold') = (hold is not null)", undefined, 'runs_hold_says_why');
    table.jsonb('override');
    shortText(table, 'note', 600);
  });
  // deferred, so that two runs can exchange their numbers in one batch
  await knex.raw(`alter table runs add constraint runs_number unique (firm_id, job_id, number)
    deferrable initially deferred`);
  await putBehindFirm(knex, 'runs');
}

export const down = (knex: Knex) => knex.schema.dropTable('runs');
