import type { JobSummary } from '@/api/contracts/job';

import { instantOf } from './due-words';

/** What is due next comes first; then what has no date; then what is past, the latest first. */
export function inOrderOfDue(jobs: readonly JobSummary[], now: Date): JobSummary[] {
  return jobs
    .map((job) => ({ job, due: job.bidDue ? instantOf(job.bidDue).getTime() : null }))
    .sort((a, b) => rank(a.due, now) - rank(b.due, now) || a.job.number.localeCompare(b.job.number))
    .map(({ job }) => job);
}

const far = 1e15;
const rank = (due: number | null, now: Date): number => {
  if (due === null) return far;
  return due > now.getTime() ? due : 2 * far - due;
};
