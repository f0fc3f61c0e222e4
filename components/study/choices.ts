import type { SpecificationRow } from '@/api/contracts/build-up';
import type { Run } from '@/api/contracts/run';
import type { RunStudy } from '@/api/contracts/study';

import type { StudiedRun } from './study-facts';

import type { Standing } from './put-up';

/** A run before its study, and what was handed down for it. */
export type Deciding = { jobId: string; run: Run; runStudy: StudiedRun; row: SpecificationRow | undefined };

export type Choices = {
  /** the selected thickness can go up: as specified without a word, else with a reason; the thing to do where what is up falls short */
  use: { place: number; asSpecified: boolean; isDue: boolean } | null;
  /** what is up falls short and may stay, with a reason */
  keep: number | null;
  /** something of the specification was departed from */
  back: boolean;
};

type Studied = Pick<Deciding, 'runStudy' | 'row'>;

export function choicesOf({ runStudy, row }: Studied, standing: Standing, selected: number): Choices {
  const { used, assembly } = runStudy;
  const falls = used !== null && !meetsAll(runStudy, used);
  return {
    use: isOther(runStudy, selected)
      ? {
          place: selected,
          asSpecified: selected === standing.specified,
          isDue: (falls || used === null) && meetsAll(runStudy, selected),
        }
      : null,
    keep: falls ? used : null,
    back: assembly.source === 'chosen' && row !== undefined,
  };
}

const meetsAll = ({ study }: RunStudy, place: number): boolean => study.candidates[place]?.meetsAll === true;
/** Made, and not what is up already. */
const isOther = ({ study, used }: RunStudy, place: number): boolean =>
  place !== used && study.candidates[place] !== undefined && study.candidates[place].name !== null;

/** Where the strip begins: at what is up when that stands; else at what is proposed, or at the thickest that is made. */
export function firstSelected({ study, used }: RunStudy): number {
  if (used !== null && study.candidates[used]?.meetsAll === true) return used;
  return study.proposed ?? used ?? study.candidates.length - 1;
}
