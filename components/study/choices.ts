import type { SpecificationRow } from '@/api/contracts/build-up';
import type { Run } from '@/api/contracts/run';
import type { RunStudy } from '@/api/contracts/study';

import type { Standing } from './put-up';

/** A run before its study, and what was handed down for it. */
export type Deciding = { jobId: string; run: Run; runStudy: RunStudy; row: SpecificationRow | undefined };

export type Choices = {
  /** the selected thickness can go up: as specified without a word, else with a reason */
  use: { place: number; asSpecified: boolean } | null;
  /** what is up falls short and may stay, with a reason */
  keep: number | null;
  /** something of the specification was departed from */
  back: boolean;
};

export function choicesOf(
  { runStudy, row }: Pick<Deciding, 'runStudy' | 'row'>,
  standing: Standing,
  selected: number,
): Choices {
  const { study, used, assembly } = runStudy;
  const isMade = study.candidates[selected]?.name !== null;
  const falls = used !== null && study.candidates[used]?.meetsAll === false;
  return {
    use: isMade && selected !== used ? { place: selected, asSpecified: selected === standing.specified } : null,
    keep: falls ? used : null,
    back: assembly.source === 'chosen' && row !== undefined,
  };
}

/** Where the strip begins: what is proposed, else what is up, else the thickest that is made. */
export const firstSelected = ({ study, used }: RunStudy): number =>
  study.proposed ?? used ?? study.candidates.length - 1;
