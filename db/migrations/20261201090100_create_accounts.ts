import type { Knex } from 'knex';

import { putBehindFirm } from '../firm-wall';

/** Accounts are out of the app role's reach; a firm's people are read through the view `members`. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('accounts', (table) => {
    table.uuid('id').primary().defaultTo(knex.fn.uuid());
    table.text('name').notNullable().checkLength('<=', 120);
    table.text('email').notNullable().checkLength('<=', 254);
    table.text('password_hash').notNullable();
    table.timestamp('created_at', { useTz: true }).notNullable().defaultTo(knex.fn.now());
  });
  await knex.raw('create unique index accounts_email on accounts (lower(email))');

  await knex.schema.createTable('memberships', (table) => {
    table.uuid('firm_id').notNullable().references('firms.id').onDelete('CASCADE');
    table.uuid('account_id').notNullable().references('accounts.id').onDelete('CASCADE').index();
    table.text('role').notNullable().checkIn(['owner', 'estimator', 'foreman']);
    table.boolean('may_send').notNullable().defaultTo(false);
    table.boolean('sees_margin').notNullable().defaultTo(false);
    table.text('units').notNullable().checkIn(['SI', 'IP']);
    table.timestamp('created_at', { useTz: true }).notNullable().defaultTo(knex.fn.now());
    table.primary(['firm_id', 'account_id']);
  });
  await putBehindFirm(knex, 'memberships', { grant: 'select (firm_id, account_id), update (units)' });

  await knex.raw(`
    create view members with (security_barrier) as
      select m.firm_id, m.account_id, a.name, a.email, m.role, m.may_send, m.sees_margin, m.units
      from memberships m join accounts a on a.id = m.account_id
      where m.firm_id = nullif(current_setting('app.firm', true), '')::uuid;
    grant select on members to thickset_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop view members');
  for (const table of ['memberships', 'accounts']) await knex.schema.dropTable(table);
}
