import type { Words, WordsKind } from '../words';
import type { LimitKind, LimitVerdict, StudyInput } from './study-types';

type Details = Partial<Omit<LimitVerdict, 'kind' | 'verdict' | 'because'>>;

const blank = {
  value: null,
  limit: null,
  margin: null,
  unit: null,
  state: null,
  dewPoint: null,
  sweatsFrom: null,
  judgedAt: null,
  source: '',
} as const;

export const doesNotApply = (kind: LimitKind, because: Words, source = ''): LimitVerdict => ({
  ...blank,
  kind,
  verdict: 'does-not-apply',
  because,
  source,
});

export const cannotTell = (kind: LimitKind, because: Words, details: Details = {}): LimitVerdict => ({
  ...blank,
  ...details,
  kind,
  verdict: 'cannot-tell',
  because,
});

export type Judged = Details & { isMet: boolean; because: Words };

export const judged = (kind: LimitKind, { isMet, because, ...details }: Judged): LimitVerdict => ({
  ...blank,
  ...details,
  kind,
  verdict: isMet ? 'met' : 'not-met',
  because,
});

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
