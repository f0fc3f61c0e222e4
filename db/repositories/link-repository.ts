import type { Knex } from 'knex';

export type NewLink = { messageId: string; tokenHash: Buffer; expiresAt: Date };

/** Private links of a firm's messages, from the firm's side. */
export function createLinkRepository(transaction: Knex.Transaction, firmId: string) {
  return {
    async insert({ messageId, tokenHash, expiresAt }: NewLink): Promise<void> {
      const row = { firm_id: firmId, message_id: messageId, token_hash: tokenHash, expires_at: expiresAt };
      await transaction('links').insert(row);
    },
    /** False when the message has no link that still opens. */
    async revoke(messageId: string, at: Date): Promise<boolean> {
      const open = transaction('links').where({ firm_id: firmId, message_id: messageId }).whereNull('revoked_at');
      return (await open.update({ revoked_at: at, updated_at: transaction.fn.now() })) === 1;
    },
  };
}
export type LinkRepository = ReturnType<typeof createLinkRepository>;
