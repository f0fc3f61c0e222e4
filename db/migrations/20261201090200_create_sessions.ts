import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  // connect-pg-simple names the columns
  await knex.schema.createTable('sessions', (table) => {
    table.text('sid').primary();
    table.json('sess').notNullable();
    table.timestamp('expire', { useTz: true }).notNullable().index();
  });
  await knex.raw('grant select, insert, update, delete on sessions to thickset_app');

  // how often something was tried, by a hash of what; only the doors touch it
  await knex.schema.createTable('tries', (table) => {
    table.text('key').primary();
    table.integer('count').notNullable();
    table.timestamp('ends_at', { useTz: true }).notNullable().index();
  });
}

export async function down(knex: Knex): Promise<void> {
  for (const table of ['tries', 'sessions']) await knex.schema.dropTable(table);
}
