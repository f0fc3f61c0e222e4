import type { RunRow } from '@/components/run/run-row';

import type { FlaggedRun } from './flag-list';

/** Runs with flags, in the order of the list. */
export const flaggedRows = (rows: readonly RunRow[]): FlaggedRun[] =>
  rows.flatMap((row) => (row.judged && row.judged.flags.length > 0 ? [{ row, flags: row.judged.flags }] : []));

/** "17 flags on 15 of 52 runs. Each would print as a clarification." */
export function flagsLead(flagged: readonly FlaggedRun[], runs: number): string {
  const flags = flagged.reduce((sum, one) => sum + one.flags.length, 0);
  if (flags === 0) return '';
  return `${flags} ${flags === 1 ? 'flag' : 'flags'} on ${flagged.length} of ${runs} runs. Each prints as a clarification.`;
}
