import type { JobSummary } from '@/api/contracts/job';

import { countdown, instantOf, plural } from './due-words';

/** "4 jobs. BLI-0417 is due next, in 1 day 21 hours." */
export function jobsLead(ordered: readonly JobSummary[], now: Date): string {
  const [next] = ordered;
  const count = `${plural(ordered.length, 'job')}.`;
  if (!next?.bidDue) return count;
  const { text, standing } = countdown(instantOf(next.bidDue), now);
  return standing === 'past' ? count : `${count} ${next.number} is due next, ${text}.`;
}
