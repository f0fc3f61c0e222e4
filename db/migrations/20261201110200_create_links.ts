import type { Knex } from 'knex';

import { firmRow } from '../firm-rows';
import { putBehindFirm } from '../firm-wall';

/** A contact's private link to one revision: only the hash of its token is kept. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('links', (table) => {
    firmRow(knex, table);
    table.uuid('message_id').notNullable();
    table.unique(['firm_id', 'message_id']);
    table.foreign(['firm_id', 'message_id']).references(['firm_id', 'id']).inTable('messages').onDelete('CASCADE');
    table.binary('token_hash').notNullable().unique();
    table.timestamp('expires_at', { useTz: true }).notNullable();
    table.timestamp('revoked_at', { useTz: true });
    table.check('octet_length(token_hash) = 32', undefined, 'hash_is_sha256');
  });
  await knex.schema.createTable('link_openings', (table) => {
    table.uuid('firm_id').notNullable();
    table.uuid('link_id').notNullable();
    table.specificType('id', 'bigint generated always as identity').primary();
    table.foreign(['firm_id', 'link_id']).references(['firm_id', 'id']).inTable('links').onDelete('CASCADE');
    table.index(['firm_id', 'link_id']);
    table.timestamp('opened_at', { useTz: true }).notNullable();
    table.text('what').notNullable().checkIn(['page', 'pdf']);
    table.text('address').notNullable().checkLength('<=', 45);
    table.text('agent').notNullable().checkLength('<=', 40);
  });
  await putBehindFirm(knex, 'links', { grant: 'select, insert, update' });
  await putBehindFirm(knex, 'link_openings', { grant: 'select' });
}

export async function down(knex: Knex): Promise<void> {
  for (const table of ['link_openings', 'links']) await knex.schema.dropTable(table);
}
