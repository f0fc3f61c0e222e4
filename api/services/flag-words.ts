import type { LimitVerdict } from '@/api/engine/limits/study-types';
import type { ThicknessName } from '@/api/engine/standards/thickness-name';
import type { Words, WordsKind } from '@/api/engine/words';

/** What falls short and what would meet it: "Surface 63.1 °C, limit 60 °C. 51 mm meets it." */
export function limitFlagWords(verdict: LimitVerdict, meeting: readonly ThicknessName[] | null): Words {
  if (verdict.verdict === 'cannot-tell') return ['Cannot tell: ', ...verdict.because, '.'];
  return [...shortfall(verdict), ' ', ...whatMeets(meeting)];
}

const whatMeets = (meeting: readonly ThicknessName[] | null): Words =>
  meeting ? [{ thickness: [...meeting] }, ' meets it.'] : ['No made thickness with this finish meets it.'];

function shortfall(verdict: LimitVerdict): Words {
  const { kind, value, limit, margin, unit } = verdict;
  if (kind === 'dew-point') return dewPointWords(verdict);
  if (value === null || limit === null || unit === null || kind === 'material') return sentence(verdict.because);
  const compared = (name: string): Words => [
    name,
    number(unit, Math.abs(value)),
    ', limit ',
    entered(unit, limit),
    '.',
  ];
  if (kind === 'touch') return compared('Surface ');
  if (kind === 'heat-flow') return compared('Heat flow ');
  if (unit === 'dimension')
    return ['Short of the energy-code row entered by ', number(unit, Math.abs(margin ?? 0)), '.'];
  return ['Resistance ', number(unit, value), ', the energy-code row entered asks ', number(unit, limit), '.'];
}

function dewPointWords({ value, dewPoint, margin, state, sweatsFrom, because }: LimitVerdict): Words {
  if (value === null || dewPoint === null || margin === null) return sentence(because);
  const above = value - dewPoint;
  if (state !== 'sweats')
    return [
      'Marginal: surface ',
      number('difference', above),
      ' above the dew point of ',
      number('temperature', dewPoint),
      ', limit ',
      entered('difference', above - margin),
      '.',
    ];
  const begins: Words = sweatsFrom === null ? [] : [' Sweating begins at ', number('humidity', sweatsFrom), '.'];
  return [
    'Sweats: surface ',
    number('temperature', value),
    ', dew point ',
    number('temperature', dewPoint),
    '.',
    ...begins,
  ];
}

function sentence([first = '', ...rest]: Words): Words {
  const start = typeof first === 'string' ? first.charAt(0).toUpperCase() + first.slice(1) : first;
  return [start, ...rest, '.'];
}

const number = (kind: WordsKind, value: number): Words[number] => ({ kind, value });

/** A limit entered as a whole number is said as one. */
const entered = (kind: WordsKind, value: number): Words[number] =>
  Math.abs(value - Math.round(value)) < 1e-6 ? { kind, value, digits: 0 } : number(kind, value);
