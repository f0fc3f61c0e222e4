import { inchLabel, millimetreLabel, type ThicknessName } from '@/api/engine/standards/thickness-name';
import type { Words } from '@/api/engine/words';

import { inUnits, showWithUnit, type UnitSystem } from './quantities';

export type { Words };

/** A sentence of the engine in a reader's units. */
export const wordsText = (words: Words, units: UnitSystem): string =>
  words.map((part) => partText(part, units)).join('');

/** Names of layers from the inside out, as a person reads them: `64 + 51 mm`, `2-1/2 + 2 in`. */
export function thicknessText(names: readonly ThicknessName[], units: UnitSystem): string {
  if (units === 'SI') return `${names.map(millimetreLabel).join(' + ')} mm`;
  const inches = names.every((name) => name.startsWith('in:'));
  return inches
    ? `${names.map(inchLabel).join(' + ')} in`
    : names.map((name) => (name.startsWith('in:') ? `${inchLabel(name)} in` : inchLabel(name))).join(' + ');
}

function partText(part: Words[number], units: UnitSystem): string {
  if (typeof part === 'string') return part;
  if ('thickness' in part) return thicknessText(part.thickness, units);
  return showWithUnit(part.kind, part.value, { units, digits: digitsOf(part, units) });
}

type Amount = Extract<Words[number], { kind: string }>;

/** A limit of 43 °C is said whole, but as 109.4 °F: what is whole in one system need not be in the other. */
function digitsOf({ kind, value, digits }: Amount, units: UnitSystem): number | undefined {
  const shown = inUnits(kind, value, units);
  return digits === 0 && Math.abs(shown - Math.round(shown)) > 1e-6 ? undefined : digits;
}
