import type { Knex } from 'knex';

import type { Message, MessageState } from '@/api/contracts/revision';

import { changed, messagesWithLinks, toMessage, type MessageRow, type StateChange } from './message-repository';

/** What a worker needs of a message that it holds. */
export type HeldMessage = Message & { words: string; sender: { name: string; email: string }; claimedAt: Date | null };
export type Composed = { bytes: Buffer; hash: string; messageId: string };
/** Which attempt an answer belongs to: a later one is not overwritten by an earlier one's. */
export type Attempt = { id: string; attempts: number; states: MessageState[] };

/** Messages as the worker that sends them holds, claims and settles them. */
export function createOutgoingRepository(transaction: Knex.Transaction, firmId: string) {
  const messages = () => transaction('messages').where({ firm_id: firmId });
  return {
    /** Holds the message for this transaction: one worker at a time. */
    async hold(id: string): Promise<HeldMessage | undefined> {
      const held: unknown = await messages().where({ id }).forUpdate().select('id').first();
      if (!held) return undefined;
      const rows: MessageRow[] = await messagesWithLinks(transaction, firmId).where({ 'messages.id': id });
      return rows[0] && toHeld(rows[0]);
    },
    /** The message's bytes, made once. */
    async storeBytes(id: string, { bytes, hash, messageId }: Composed): Promise<void> {
      await messages().where({ id }).update({ mime: bytes, mime_hash: hash, message_id: messageId });
    },
    async bytes(id: string): Promise<Buffer | undefined> {
      const row: { mime: Buffer | null } | undefined = await messages().where({ id }).select('mime').first();
      return row?.mime ?? undefined;
    },
    async claim(id: string, at: Date): Promise<void> {
      const values = { state: 'sending', claimed_at: at, attempts: transaction.raw('attempts + 1') };
      await messages().where({ id }).update(changed(transaction, values));
    },
    /** Records what came of an attempt; false when something else was settled in the meantime. */
    async settleAttempt(
      { id, attempts, states }: Attempt,
      { state, answer, sentAt = null }: StateChange,
    ): Promise<boolean> {
      const open = messages().where({ id, attempts }).whereIn('state', states);
      return (await open.update(changed(transaction, { state, answer, sent_at: sentAt }))) === 1;
    },
  };
}
export type OutgoingRepository = ReturnType<typeof createOutgoingRepository>;

const toHeld = (row: MessageRow): HeldMessage => ({
  ...toMessage(row),
  words: row.words,
  sender: { name: row.sender_name, email: row.sender_email },
  claimedAt: row.claimed_at,
});
