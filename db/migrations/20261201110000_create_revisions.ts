import type { Knex } from 'knex';

import { jobRow, shortText } from '../firm-rows';
import { putBehindFirm } from '../firm-wall';

/** What was frozen never changes, and what was rendered is stored once: the database refuses, whoever asks. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('revisions', (table) => {
    jobRow(knex, table);
    table.integer('ordinal').notNullable().checkPositive();
    table.unique(['firm_id', 'job_id', 'ordinal']);
    shortText(table, 'letter', 4);
    table.timestamp('frozen_at', { useTz: true }).notNullable();
    shortText(table, 'frozen_by', 120);
    table.date('valid_until').notNullable();
    table.timestamp('expires_at', { useTz: true }).notNullable();
    table.jsonb('snapshot').notNullable();
    table.integer('runs').notNullable();
    table.integer('flags').notNullable();
    table.text('rendering').notNullable().defaultTo('waiting').checkIn(['waiting', 'ready', 'failed']);
    table.binary('pdf');
    table.specificType('pdf_hash', 'char(64)');
    table.integer('pdf_bytes');
    table.check("(rendering = 'ready') = (pdf is not null)", undefined, 'ready_with_its_bytes');
    table.check('num_nulls(pdf, pdf_hash, pdf_bytes) in (0, 3)', undefined, 'pdf_whole');
  });
  await putBehindFirm(knex, 'revisions', { grant: 'select, insert, update' });
  await knex.raw(`
    create function refuse_change() returns trigger language plpgsql as $$
      begin
        raise exception 'What was frozen or sent does not change' using errcode = 'restrict_violation';
      end
    $$;
    create trigger frozen before update of firm_id, job_id, ordinal, letter, frozen_at, frozen_by, valid_until,
      expires_at, snapshot, runs, flags on revisions for each row execute function refuse_change();
    create trigger rendered before update of pdf, pdf_hash, pdf_bytes on revisions for each row
      when (old.pdf is not null) execute function refuse_change();
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('revisions');
  await knex.raw('drop function refuse_change()');
}
