import type { Message, Revision } from '@/api/contracts/revision';
import type { BareRevision } from '@/db/repositories/revision-repository';

/** The revision with what was sent of it. */
export function withMessages(
  { expiresAt: _expiresAt, ...revision }: BareRevision,
  messages: readonly Message[],
): Revision {
  return { ...revision, messages: messages.filter(({ revisionId }) => revisionId === revision.id) };
}
