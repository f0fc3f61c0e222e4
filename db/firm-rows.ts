import type { Knex } from 'knex';

type Table = Knex.CreateTableBuilder;

/** What every row of a firm has: its id, its firm, the version an edit names, and its times. */
export function firmRow(knex: Knex, table: Table): void {
  table.uuid('id').notNullable().defaultTo(knex.fn.uuid());
  table.uuid('firm_id').notNullable().references('firms.id').onDelete('CASCADE');
  table.primary(['firm_id', 'id']); // children refer to both, so none can hang on another firm's parent
  table.integer('version').notNullable().defaultTo(1).checkPositive();
  table.specificType('entered', 'bigint generated always as identity'); // the order in which rows were entered
  table.timestamp('created_at', { useTz: true }).notNullable().defaultTo(knex.fn.now());
  table.timestamp('updated_at', { useTz: true }).notNullable().defaultTo(knex.fn.now());
}

/** A row of a job as well: its children refer to firm, job and id, so they cannot hang on another job's row. */
export function jobRow(knex: Knex, table: Table): void {
  firmRow(knex, table);
  table.uuid('job_id').notNullable();
  table.unique(['firm_id', 'job_id', 'id']);
  table.foreign(['firm_id', 'job_id']).references(['firm_id', 'id']).inTable('jobs').onDelete('CASCADE');
}

/** A reference to a row of the same job. */
export function inJob(table: Table, column: string, parent: string): void {
  table.foreign(['firm_id', 'job_id', column]).references(['firm_id', 'job_id', 'id']).inTable(parent);
  table.index(['firm_id', 'job_id', column]);
}

/** Text that holds at most `most` characters; the contract says the same where people read it. */
export const shortText = (table: Table, column: string, most: number): Knex.ColumnBuilder =>
  table.text(column).notNullable().checkLength('<=', most);
