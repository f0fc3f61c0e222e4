import type { ThicknessName } from '../standards/thickness-name';
import type { Words } from '../words';
import { nextThinner } from './candidates';
import { failing, governingOf, isBare, weight } from './choosing';
import { shortfall } from './shortfall';
import type { Candidate, LimitKind, LimitVerdict, Study } from './study-types';

type Told = Pick<Study, 'candidates' | 'specified' | 'proposed' | 'meets'>;

export const limitWords: Record<LimitKind, string> = {
  touch: 'the touch limit',
  'dew-point': 'the dew point',
  'energy-code': 'the energy code',
  'heat-flow': 'the heat-flow limit',
  material: 'the material limit',
};

/** What stands or falls, and by how much: of the specified thickness, else of the proposed one. */
export function sentenceOf(study: Told): Words {
  const place = study.specified ?? study.proposed;
  const candidate = place === null ? undefined : study.candidates[place];
  if (place === null || !candidate) return nothingMeets(study);
  return candidate.meetsAll ? standing(study, place, candidate) : falling(study, candidate);
}

function falling({ candidates }: Told, candidate: Candidate): Words {
  const [first] = failing(candidate).sort((one, other) => weight(one.kind) - weight(other.kind));
  if (!first) return [];
  if (first.verdict === 'cannot-tell') {
    return [subject(candidate), ' cannot be told: ', ...first.because, '.'];
  }
  if (first.kind === 'material') return [subject(candidate), ' does not do: ', ...first.because, '.'];
  return [subject(candidate), ' is not enough. It ', ...reason(first, candidate, { at: 0, candidates })];
}

/** "114 mm meets every limit; the energy code governs: 102 mm falls one size short." */
function standing({ candidates, meets, proposed }: Told, place: number, candidate: Candidate): Words {
  const thinner = thinnerThan(candidates, place);
  const governing = governingOf(candidates, place, meets);
  const verdict = thinner && failing(thinner).find(({ kind }) => kind === governing);
  if (!thinner || !governing || !verdict)
    return [subject(candidate), ' meets every limit', ...soWould(candidates, proposed, place)];
  const words = shortfall(verdict, thinner, candidates);
  const who: Words = isBare(thinner) ? ['bare it '] : [subject(thinner), ' '];
  return [subject(candidate), ` meets every limit; ${limitWords[governing]} governs: `, ...who, ...words, '.'];
}

function soWould(candidates: readonly Candidate[], proposed: number | null, place: number): Words {
  const less = proposed === null || proposed >= place ? undefined : candidates[proposed];
  return less ? ['; so would ', subject(less), '.'] : ['.'];
}

function nothingMeets({ candidates, meets }: Told): Words {
  const thickest = candidates.at(-1);
  if (!thickest || isBare(thickest)) return ['No thickness of this material is known to be made for this shape.'];
  const never = meets.filter(({ candidate }) => candidate === null).map(({ kind }) => limitWords[kind]);
  const [first] = failing(thickest).sort((one, other) => weight(one.kind) - weight(other.kind));
  if (!first || never.length === 0) return ['No made thickness meets every limit at once.'];
  if (first.verdict === 'cannot-tell') return ['No thickness can be proposed: ', ...first.because, '.'];
  const said =
    first.kind === 'material'
      ? [': ', ...first.because]
      : [': even ', subject(thickest), ' ', ...shortfall(first, thickest, candidates)];
  return [`Nothing made meets ${listed(never)}`, ...said, '.'];
}

/** Why no thinner than the proposed; where another is specified, first that the proposed is the thinnest that does. */
export function whyNotThinnerOf(study: Told): Words {
  const { candidates, proposed, specified } = study;
  const candidate = proposed === null ? undefined : candidates[proposed];
  if (proposed === null || !candidate) return nothingMeets(study);
  const thinner = thinnerThan(candidates, proposed);
  if (!thinner || isBare(thinner))
    return [...thinnestMade(candidate), ...(thinner ? bareWould(thinner, candidates) : [])];
  const isOther = specified !== null && specified !== proposed;
  const start: Words = isOther ? [subject(candidate), ' is the thinnest made that meets every limit. '] : [];
  return [...start, subject(thinner), ' ', ...reasons(thinner, candidates)];
}

const thinnestMade = (candidate: Candidate): Words => [
  subject(candidate),
  ' is the thinnest made, and meets every limit.',
];

function bareWould(bare: Candidate, candidates: readonly Candidate[]): Words {
  const because = reasons(bare, candidates);
  return because.length > 0 ? [' Bare it ', ...because] : [' Bare would meet every limit entered too.'];
}

function reasons(thinner: Candidate, candidates: readonly Candidate[]): Words {
  const ordered = failing(thinner).sort((one, other) => weight(one.kind) - weight(other.kind));
  return ordered.flatMap((verdict, at) => reason(verdict, thinner, { at, candidates }));
}

type Reason = { at: number; candidates: readonly Candidate[] };

const reason = (verdict: LimitVerdict, thinner: Candidate, { at, candidates }: Reason): Words => [
  ...(at > 0 ? [' It '] : []),
  ...shortfall(verdict, thinner, candidates),
  verdict.kind === 'energy-code' && verdict.unit === 'dimension' ? ' of the energy code.' : '.',
];

function thinnerThan(candidates: readonly Candidate[], place: number): Candidate | undefined {
  const builds = candidates.map(({ layerThicknesses }) => ({ thicknesses: layerThicknesses }));
  const thinner = nextThinner(builds, place);
  return thinner === null ? undefined : candidates[thinner];
}

const subject = ({ names }: Candidate): Words[number] =>
  names.length === 0 ? 'Bare' : { thickness: [...names] satisfies ThicknessName[] };

const listed = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;
