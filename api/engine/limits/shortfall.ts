import type { Words } from '../words';
import { isBare, verdictOf } from './choosing';
import type { Candidate, LimitVerdict } from './study-types';
import { amount } from './verdict';

/** What a thickness would do instead of meeting a limit, as a foreman says it: follows its name or "It". */
export function shortfall(verdict: LimitVerdict, candidate: Candidate, candidates: readonly Candidate[]): Words {
  if (verdict.verdict === 'cannot-tell') return ['cannot be told: ', ...verdict.because];
  switch (verdict.kind) {
    case 'touch':
      return tooHot(verdict);
    case 'dew-point':
      return tooCold(verdict);
    case 'heat-flow':
      return tooMuchHeat(verdict, candidate);
    case 'energy-code':
      return tooThin(verdict, candidate, candidates);
    case 'material':
      return ['does not do: ', ...verdict.because];
  }
}

const tooHot = ({ value, limit }: LimitVerdict): Words => [
  'would reach ',
  amount('temperature', value ?? NaN),
  ' where hands can; the limit is ',
  amount('temperature', limit ?? NaN, wholeDigits(limit)),
];

function tooCold({ value, dewPoint, margin, state }: LimitVerdict): Words {
  if (value === null || dewPoint === null || margin === null) return [];
  const asked = value - dewPoint - margin;
  if (state === 'sweats') {
    return [
      'would sweat: its surface is at ',
      amount('temperature', value),
      ', the dew point at ',
      amount('temperature', dewPoint),
    ];
  }
  const above = amount('difference', value - dewPoint);
  return [
    'would stay only ',
    above,
    ' above the dew point; ',
    amount('difference', asked, wholeDigits(asked)),
    ' is asked',
  ];
}

function tooMuchHeat({ value, limit, unit }: LimitVerdict, { heat }: Candidate): Words {
  const kind = unit === 'heatFlux' ? 'heatFlux' : 'heatPerLength';
  const verb = heat.flux < 0 ? 'would take up ' : 'would lose ';
  return [verb, amount(kind, value ?? NaN), '; the limit is ', amount(kind, limit ?? NaN)];
}

/** Follows "falls": the sentence that holds it names the energy code. */
function tooThin(verdict: LimitVerdict, candidate: Candidate, candidates: readonly Candidate[]): Words {
  const { value, limit, unit } = verdict;
  if (unit === 'resistance' && value !== null && limit !== null) {
    return ['has an R of ', amount('resistance', value), '; the table entered asks for ', amount('resistance', limit)];
  }
  if (isBare(candidate)) return ['falls short'];
  const sizes = sizesShort(candidate, candidates);
  if (sizes === null) return ['falls short'];
  return [sizes === 1 ? 'falls one size short' : `falls ${count(sizes)} sizes short`];
}

/** How many made sizes lie from this one up to the first that meets the energy code. */
function sizesShort(candidate: Candidate, candidates: readonly Candidate[]): number | null {
  const from = candidates.indexOf(candidate);
  const to = candidates.findIndex((other, place) => place > from && verdictOf(other, 'energy-code')?.verdict === 'met');
  return from < 0 || to < 0 ? null : to - from;
}

const words = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine'];
const count = (number: number): string => words[number] ?? String(number);

/** A limit entered as a whole number is said as one. */
const wholeDigits = (value: number | null): number | undefined =>
  value !== null && Math.abs(value - Math.round(value)) < 1e-6 ? 0 : undefined;
