import { nextThinner } from './candidates';
import {
  type Candidate,
  type LimitInput,
  type LimitKind,
  limitKinds,
  type LimitVerdict,
  type Study,
} from './study-types';

type Picked = Pick<Study, 'proposed' | 'governing' | 'meets'>;

const isFine = ({ verdict }: LimitVerdict): boolean => verdict === 'met' || verdict === 'does-not-apply';
export const isBare = ({ name }: Candidate): boolean => name === null;
export const failing = ({ verdicts }: Candidate): LimitVerdict[] => verdicts.filter((verdict) => !isFine(verdict));
export const meetsAll = (verdicts: readonly LimitVerdict[]): boolean => verdicts.every(isFine);

/**
 * The proposed thickness: the thinnest made that meets all limits that apply. The governing limit: the one that forbids
 * the next thinner; of several the one that asks for most; when nothing meets all, the first that is never met.
 */
export function choose(candidates: readonly Candidate[], limits: readonly LimitInput[]): Picked {
  const meets = limits.filter(({ kind }) => applies(candidates, kind)).map(({ kind }) => meetsOne(candidates, kind));
  const proposed = candidates.findIndex((candidate) => !isBare(candidate) && candidate.meetsAll);
  if (proposed < 0) {
    const never = meets.find(({ candidate }) => candidate === null)?.kind ?? meets[0]?.kind;
    return { proposed: null, governing: never ?? null, meets };
  }
  return { proposed, governing: governingOf(candidates, proposed, meets), meets };
}

function applies(candidates: readonly Candidate[], kind: LimitKind): boolean {
  return candidates.some((candidate) => !isBare(candidate) && verdictOf(candidate, kind)?.verdict !== 'does-not-apply');
}

export const verdictOf = ({ verdicts }: Candidate, kind: LimitKind): LimitVerdict | undefined =>
  verdicts.find((verdict) => verdict.kind === kind);

function meetsOne(candidates: readonly Candidate[], kind: LimitKind): Study['meets'][number] {
  const place = candidates.findIndex(
    (candidate) => !isBare(candidate) && verdictOf(candidate, kind)?.verdict === 'met',
  );
  return { kind, candidate: place < 0 ? null : place };
}

/** The limit that forbids the next thinner than `place`; null when none does. */
export function governingOf(candidates: readonly Candidate[], place: number, meets: Study['meets']): LimitKind | null {
  const thinner = nextThinner(
    candidates.map(({ layerThicknesses }) => ({ thicknesses: layerThicknesses })),
    place,
  );
  const candidate = thinner === null ? undefined : candidates[thinner];
  if (!candidate) return null;
  const asked = (kind: LimitKind) => meets.find((met) => met.kind === kind)?.candidate ?? Infinity;
  const kinds = failing(candidate).map(({ kind }) => kind);
  const order = [...kinds].sort((one, other) => asked(other) - asked(one) || weight(one) - weight(other));
  return order[0] ?? null;
}

/** What can hurt people or the building is said before what costs energy. */
const importance: readonly LimitKind[] = ['touch', 'dew-point', 'material', 'heat-flow', 'energy-code'];
export const weight = (kind: LimitKind): number =>
  importance.indexOf(kind) + limitKinds.length * Number(!importance.includes(kind));
