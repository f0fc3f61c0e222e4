import type { Candidate, LimitVerdict } from '@/api/contracts/study';
import { showWithUnit, type UnitSystem } from '@/api/contracts/quantities';
import { limitWords } from '@/api/contracts/run-words';
import { thicknessText } from '@/api/contracts/words-text';
import type { Verdict } from '@/components/ui/mark';

export type CandidateMark = { verdict: Verdict; words: string };

/** "114 mm", "64 + 51 mm", "bare". */
export const candidateName = ({ names }: Pick<Candidate, 'names'>, units: UnitSystem): string =>
  names.length === 0 ? 'bare' : thicknessText(names, units);

/** Heat goes by the metre of run, or by the square metre where there is no length. */
export const heatKind = (candidate: Candidate | undefined) =>
  candidate?.heat.heatFlow === null ? ('heatFlux' as const) : ('heatPerLength' as const);

/** "33 W/m", "8.4 W/m", "−18 W/m": as exact as it is read beside others. */
export function heatText(candidate: Candidate, units: UnitSystem, digits?: number): string {
  const value = candidate.heat.heatFlow ?? candidate.heat.flux;
  const quiet = Math.abs(value) >= 19.95 ? 0 : 1;
  return showWithUnit(heatKind(candidate), value, { units, digits: digits ?? quiet });
}

/** What a thickness fails, each in a word; else that it meets all. */
export function marksOf({ verdicts, meetsAll }: Candidate): CandidateMark[] {
  const marks = verdicts.flatMap(markOf);
  if (marks.length > 0) return marks;
  return meetsAll ? [{ verdict: 'pass', words: 'meets all' }] : [{ verdict: 'none', words: 'not judged' }];
}

/** Where columns are narrow: the word that the trade would shout across a plant room. */
const short: Partial<Record<LimitVerdict['kind'], string>> = { 'energy-code': 'code' };

function markOf({ kind, verdict, state }: LimitVerdict): CandidateMark[] {
  const limit = short[kind] ?? limitWords[kind];
  if (verdict === 'cannot-tell') return [{ verdict: 'caution', words: `${limit}?` }];
  if (verdict !== 'not-met') return [];
  if (state === 'sweats') return [{ verdict: 'fail', words: 'sweats' }];
  return state === 'marginal' ? [{ verdict: 'caution', words: 'marginal' }] : [{ verdict: 'fail', words: limit }];
}

/** The same, said out: for who hears the strip, and for the table. */
export function marksText(candidate: Candidate): string {
  const { verdicts } = candidate;
  const words = verdicts.flatMap(({ kind, verdict, state }) => {
    if (verdict === 'cannot-tell') return [`cannot tell ${limitWords[kind]}`];
    return verdict === 'not-met' ? [`fails ${limitWords[kind]}${state ? ` (${state})` : ''}`] : [];
  });
  return words.length > 0 ? words.join(', ') : (marksOf(candidate)[0]?.words ?? '');
}
