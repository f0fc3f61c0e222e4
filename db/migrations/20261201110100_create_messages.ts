import type { Knex } from 'knex';

import { firmRow, shortText } from '../firm-rows';
import { putBehindFirm } from '../firm-wall';

/** An outgoing e-mail to one contact; `mime` holds the exact bytes, made once. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('messages', (table) => {
    firmRow(knex, table);
    table.uuid('revision_id').notNullable();
    table.foreign(['firm_id', 'revision_id']).references(['firm_id', 'id']).inTable('revisions').onDelete('CASCADE');
    table.index(['firm_id', 'revision_id']);
    table.uuid('contact_id').notNullable();
    table.foreign(['firm_id', 'contact_id']).references(['firm_id', 'id']).inTable('contacts');
    table.index(['firm_id', 'contact_id']);
    shortText(table, 'to_name', 120);
    shortText(table, 'to_email', 254);
    shortText(table, 'sender_name', 120);
    shortText(table, 'sender_email', 254);
    shortText(table, 'subject', 200);
    shortText(table, 'words', 4000);
    table
      .text('state')
      .notNullable()
      .defaultTo('waiting')
      .checkIn(['waiting', 'sending', 'sent', 'perhaps-sent', 'refused', 'not-sent']);
    table.text('answer').notNullable().defaultTo('');
    table.integer('attempts').notNullable().defaultTo(0);
    table.timestamp('claimed_at', { useTz: true });
    table.binary('mime');
    table.specificType('mime_hash', 'char(64)');
    table.text('message_id');
    table.timestamp('asked_at', { useTz: true }).notNullable();
    table.timestamp('sent_at', { useTz: true });
    table.check('num_nulls(mime, mime_hash, message_id) in (0, 3)', undefined, 'mime_whole');
  });
  await putBehindFirm(knex, 'messages', { grant: 'select, insert, update' });
  await knex.raw(`
    create trigger composed before update of mime, mime_hash, message_id on messages for each row
      when (old.mime is not null) execute function refuse_change();
  `);
}

export const down = (knex: Knex) => knex.schema.dropTable('messages');
