import type { Words, WordsKind } from '../words';
import type { LimitKind, LimitVerdict, StudyInput } from './study-types';

type Details = Partial<Omit<LimitVerdict, 'kind' | 'verdict' | 'because'>>;
type Answer = Pick<LimitVerdict, 'kind' | 'verdict' | 'because'>;

/** Written out field by field: a study makes a thousand of these, and spreading them costs more than solving them. */
const verdictWith = ({ kind, verdict, because }: Answer, details: Details): LimitVerdict => ({
  kind,
  verdict,
  because,
  value: details.value ?? null,
  limit: details.limit ?? null,
  margin: details.margin ?? null,
  unit: details.unit ?? null,
  state: details.state ?? null,
  dewPoint: details.dewPoint ?? null,
  sweatsFrom: details.sweatsFrom ?? null,
  judgedAt: details.judgedAt ?? null,
  source: details.source ?? '',
});

export const doesNotApply = (kind: LimitKind, because: Words, source = ''): LimitVerdict =>
  verdictWith({ kind, verdict: 'does-not-apply', because }, { source });

export const cannotTell = (kind: LimitKind, because: Words, details: Details = {}): LimitVerdict =>
  verdictWith({ kind, verdict: 'cannot-tell', because }, details);

export type Judged = Details & { isMet: boolean; because: Words };

export const judged = (kind: LimitKind, details: Judged): LimitVerdict =>
  verdictWith({ kind, verdict: details.isMet ? 'met' : 'not-met', because: details.because }, details);

const severity = { 'not-met': 3, 'cannot-tell': 2, met: 1, 'does-not-apply': 0 } as const;

/** Of several answers to one limit the worst counts; of equal ones the smallest margin. */
export function worst(verdicts: readonly [LimitVerdict, ...LimitVerdict[]]): LimitVerdict {
  return verdicts.reduce((one, other) => (isWorse(other, one) ? other : one));
}

function isWorse(one: LimitVerdict, other: LimitVerdict): boolean {
  if (one.verdict !== other.verdict) return severity[one.verdict] > severity[other.verdict];
  return (one.margin ?? Infinity) < (other.margin ?? Infinity);
}

export const amount = (kind: WordsKind, value: number, digits?: number): Words[number] =>
  digits === undefined ? { kind, value } : { kind, value, digits };

export const lowestFluid = ({ states }: StudyInput): number => Math.min(...states.map(({ lowest }) => lowest));
export const highestFluid = ({ states }: StudyInput): number => Math.max(...states.map(({ highest }) => highest));
