import type { Message, MessageState } from '@/api/contracts/revision';
import type { Verdict } from '@/components/ui/mark';

type StateWords = { verdict: Verdict; words: string; more: string };

/** What each state of an outgoing mail means, and what follows from it. */
export const messageStateWords: Record<MessageState, StateWords> = {
  waiting: { verdict: 'none', words: 'waiting', more: 'It goes out by itself.' },
  sending: { verdict: 'none', words: 'being sent', more: '' },
  sent: { verdict: 'pass', words: 'sent', more: '' },
  'perhaps-sent': {
    verdict: 'caution',
    words: 'perhaps sent',
    more: 'The connection ended before the server answered. It is not sent again by itself: ask the recipient, then say what happened.',
  },
  refused: { verdict: 'fail', words: 'refused', more: 'The mail server would not take it.' },
  'not-sent': { verdict: 'fail', words: 'not sent', more: 'Settled by hand.' },
};

/** "30 Nov 2026, 15:40", in the job's zone. */
export const momentText = (instant: string, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone }).format(new Date(instant));

/** How often a private link was opened, or why it opens no more. */
export function openingsText({ link }: Message, timeZone: string): string {
  if (!link) return '';
  if (link.revokedAt) return `The link was revoked on ${momentText(link.revokedAt, timeZone)}.`;
  const until = `It opens until ${momentText(link.expiresAt, timeZone)}.`;
  if (link.openings === 0 || !link.lastOpenedAt) return `The link has not been opened. ${until}`;
  const times = link.openings === 1 ? 'once' : `${link.openings} times`;
  return `The link was opened ${times}, last on ${momentText(link.lastOpenedAt, timeZone)}. ${until}`;
}
