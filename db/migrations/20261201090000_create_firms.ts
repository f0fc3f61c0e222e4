import type { Knex } from 'knex';

import { putBehindFirm } from '../firm-wall';

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('firms', (table) => {
    table.uuid('id').primary().defaultTo(knex.fn.uuid());
    table.text('name').notNullable().checkLength('<=', 120);
    table.text('town').notNullable().defaultTo('');
    table.text('address').notNullable().defaultTo('');
    table.text('email').notNullable().defaultTo('');
    table.text('phone').notNullable().defaultTo('');
    table.specificType('currency', 'char(3)').notNullable();
    table.text('locale').notNullable();
    table.text('paper').notNullable().checkIn(['A4', 'Letter']);
    table.text('time_zone').notNullable();
    table.text('units').notNullable().checkIn(['SI', 'IP']);
    table.text('quote_prefix').notNullable().defaultTo('');
    table.integer('quote_valid_days').notNullable().checkBetween([1, 365]);
    table.text('record_address').notNullable().defaultTo('');
    table.timestamp('created_at', { useTz: true }).notNullable().defaultTo(knex.fn.now());
  });
  await putBehindFirm(knex, 'firms', { column: 'id', grant: 'select, update' });
  // the server asks whether its migrations are the database's
  await knex.raw('grant select on knex_migrations to thickset_app');
}

export const down = (knex: Knex) => knex.schema.dropTable('firms');
