import type { Knex } from 'knex';

import type { Message, MessageState } from '@/api/contracts/revision';

export type MessageRow = {
  id: string;
  version: number;
  revision_id: string;
  contact_id: string;
  to_name: string;
  to_email: string;
  sender_name: string;
  sender_email: string;
  subject: string;
  words: string;
  state: MessageState;
  answer: string;
  attempts: number;
  claimed_at: Date | null;
  message_id: string | null;
  asked_at: Date;
  sent_at: Date | null;
  link_expires_at: Date | null;
  link_revoked_at: Date | null;
  openings: number;
  last_opened_at: Date | null;
};

export type NewMessage = {
  revisionId: string;
  contactId: string;
  to: { name: string; email: string };
  sender: { name: string; email: string };
  subject: string;
  words: string;
  askedAt: Date;
};
export type StateChange = { state: MessageState; answer: string; sentAt?: Date | null };
/** Outgoing e-mails of frozen revisions, each to one contact. */
export function createMessageRepository(transaction: Knex.Transaction, firmId: string) {
  const messages = () => transaction('messages').where({ 'messages.firm_id': firmId });
  return {
    async ofRevisions(revisionIds: readonly string[]): Promise<Message[]> {
      const rows: MessageRow[] = await messagesWithLinks(transaction, firmId)
        .whereIn('revision_id', revisionIds)
        .orderBy('messages.entered');
      return rows.map(toMessage);
    },
    async find(id: string): Promise<Message | undefined> {
      const rows: MessageRow[] = await messagesWithLinks(transaction, firmId).where({ 'messages.id': id });
      return rows[0] && toMessage(rows[0]);
    },
    /** Names of contacts to whom this revision went, is going or perhaps went. */
    async reached(revisionId: string, contactIds: readonly string[]): Promise<string[]> {
      const rows: { to_name: string }[] = await messages()
        .where({ revision_id: revisionId })
        .whereIn('contact_id', contactIds)
        .whereNotIn('state', ['refused', 'not-sent'])
        .distinct('to_name');
      return rows.map(({ to_name }) => to_name);
    },
    async everSentTo(contactId: string): Promise<boolean> {
      const row: unknown = await messages().where({ contact_id: contactId }).select('id').first();
      return row !== undefined;
    },
    async waitingOf(revisionId: string): Promise<string[]> {
      const rows: { id: string }[] = await messages().where({ revision_id: revisionId, state: 'waiting' }).select('id');
      return rows.map(({ id }) => id);
    },
    async insert({ revisionId, contactId, to, sender, subject, words, askedAt }: NewMessage): Promise<string> {
      const rows: { id: string }[] = await transaction('messages')
        .insert({
          firm_id: firmId,
          revision_id: revisionId,
          contact_id: contactId,
          to_name: to.name,
          to_email: to.email,
          sender_name: sender.name,
          sender_email: sender.email,
          subject,
          words,
          asked_at: askedAt,
        })
        .returning('id');
      return rows[0]!.id;
    },
    async setState(id: string, { state, answer, sentAt = null }: StateChange): Promise<void> {
      await messages()
        .where({ id })
        .update(changed(transaction, { state, answer, sent_at: sentAt }));
    },
  };
}
export type MessageRepository = ReturnType<typeof createMessageRepository>;

/** A message's columns but its bytes, with its link and how often that was opened. */
export function messagesWithLinks(transaction: Knex.Transaction, firmId: string) {
  const ofLink = 'from link_openings o where o.firm_id = links.firm_id and o.link_id = links.id';
  return transaction('messages')
    .where({ 'messages.firm_id': firmId })
    .leftJoin('links', { 'links.firm_id': 'messages.firm_id', 'links.message_id': 'messages.id' })
    .select<MessageRow[]>(
      ...columns,
      { link_expires_at: 'links.expires_at', link_revoked_at: 'links.revoked_at' },
      transaction.raw(`(select count(*) ${ofLink} and o.what = 'page') as openings`),
      transaction.raw(`(select max(o.opened_at) ${ofLink}) as last_opened_at`),
    );
}

export const changed = (transaction: Knex.Transaction, values: object) => ({
  ...values,
  version: transaction.raw('version + 1'),
  updated_at: transaction.fn.now(),
});

const columns = [
  'id',
  'version',
  'revision_id',
  'contact_id',
  'to_name',
  'to_email',
  'sender_name',
  'sender_email',
  'subject',
  'words',
  'state',
  'answer',
  'attempts',
  'claimed_at',
  'message_id',
  'asked_at',
  'sent_at',
].map((column) => `messages.${column}`);

export const toMessage = (row: MessageRow): Message => ({
  id: row.id,
  version: row.version,
  revisionId: row.revision_id,
  contactId: row.contact_id,
  to: { name: row.to_name, email: row.to_email },
  subject: row.subject,
  state: row.state,
  answer: row.answer,
  attempts: row.attempts,
  createdAt: row.asked_at.toISOString(),
  sentAt: row.sent_at?.toISOString() ?? null,
  messageId: row.message_id,
  link: linkOf(row),
});

const linkOf = ({ link_expires_at, link_revoked_at, openings, last_opened_at }: MessageRow): Message['link'] =>
  link_expires_at && {
    expiresAt: link_expires_at.toISOString(),
    revokedAt: link_revoked_at?.toISOString() ?? null,
    openings,
    lastOpenedAt: last_opened_at?.toISOString() ?? null,
  };
