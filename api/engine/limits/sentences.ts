import type { ThicknessName } from '../standards/thickness-name';
import type { Words } from '../words';
import { nextThinner } from './candidates';
import { failing, governingOf, isBare, weight } from './choosing';
import { shortfall } from './shortfall';
import type { Candidate, LimitKind, Study } from './study-types';

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
  return [subject(candidate), ' is not enough. It ', ...shortfall(first, candidate, candidates), '.'];
}

/** "114 mm meets every limit; the energy code governs: 102 mm falls one size short." */
function standing({ candidates, meets }: Told, place: number, candidate: Candidate): Words {
  const thinner = thinnerThan(candidates, place);
  const governing = governingOf(candidates, place, meets);
  const verdict = thinner && failing(thinner).find(({ kind }) => kind === governing);
  if (!thinner || !governing || !verdict) return [subject(candidate), ' meets every limit; so would less.'];
  const words = shortfall(verdict, thinner, candidates);
  const of = isBare(thinner) ? 'bare it ' : [subject(thinner), ' '];
  return [subject(candidate), ' meets every limit; ', `${limitWords[governing]} governs: `, ...of, ...words, '.'];
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

/** Why no thinner than the proposed; and what the specified one lacks is said with what would do. */
export function whyNotThinnerOf(study: Told): Words {
  const { candidates, proposed, specified } = study;
  const candidate = proposed === null ? undefined : candidates[proposed];
  if (proposed === null || !candidate) return nothingMeets(study);
  const isChange = specified !== null && specified !== proposed;
  const start: Words = isChange ? [subject(candidate), ' is the thinnest made that meets every limit. '] : [];
  const thinner = thinnerThan(candidates, proposed);
  if (!thinner) return [...start, 'Nothing thinner is made.'];
  const reasons = failing(thinner).sort((one, other) => weight(one.kind) - weight(other.kind));
  if (reasons.length === 0) {
    return [...start, subject(candidate), ' is the thinnest made; bare would meet every limit entered.'];
  }
  const sentences = reasons.flatMap((verdict, at) => {
    const who: Words =
      at > 0
        ? ['It ']
        : isBare(thinner)
          ? [subject(candidate), ' is the thinnest made. Bare it ']
          : [subject(thinner), ' '];
    return [...(at > 0 ? [' '] : []), ...who, ...shortfall(verdict, thinner, candidates), '.'];
  });
  return [...start, ...sentences];
}

function thinnerThan(candidates: readonly Candidate[], place: number): Candidate | undefined {
  const builds = candidates.map(({ layerThicknesses }) => ({ thicknesses: layerThicknesses }));
  const thinner = nextThinner(builds, place);
  return thinner === null ? undefined : candidates[thinner];
}

const subject = ({ names }: Candidate): Words[number] =>
  names.length === 0 ? 'Bare' : { thickness: [...names] satisfies ThicknessName[] };

const listed = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;
