import type { LibraryCurve, LibraryMaterial, LibrarySeries } from '@/api/contracts/library';
import { show, showWithUnit, unitLabel, type UnitSystem } from '@/api/contracts/quantities';
import { degreesText } from '@/components/place/place-words';

/** What kind of curve it is, as one would say it on the telephone. */
export const curveWords: Record<LibraryCurve['kind'], string> = {
  max: 'Highest that the standard allows',
  typical: 'Typical published values',
  design: 'Design values',
  measured: 'Measured values',
};

export const formWords: Record<LibrarySeries['form'], string> = {
  section: 'Pipe section',
  tube: 'Tube',
  sheet: 'Sheet',
  board: 'Board',
  blanket: 'Blanket',
  liner: 'Liner',
  mat: 'Mat',
};

/** "−4 to 454 °C", "up to 105 °C": what the material is used between. */
export function limitsOfUseText({ useMinimum, useMaximum }: LibraryMaterial, units: UnitSystem): string {
  if (useMinimum === null && useMaximum === null) return 'not stated';
  if (useMinimum === null) return `up to ${degreesText(useMaximum!, units)}`;
  if (useMaximum === null) return `from ${degreesText(useMinimum, units)}`;
  return `${degreesText(useMinimum, units)} to ${degreesText(useMaximum, units)}`;
}

/** Conductivity at one mean temperature on the curve, straight between its points; null outside them. */
export function conductivityAt(curve: LibraryCurve, mean: number): number | null {
  const after = curve.points.findIndex(([temperature]) => temperature >= mean);
  if (after < 0) return null;
  const [t2, k2] = curve.points[after]!;
  if (t2 === mean) return k2;
  const before = curve.points[after - 1];
  if (!before) return null;
  const [t1, k1] = before;
  return k1 + ((k2 - k1) * (mean - t1)) / (t2 - t1);
}

export const conductivityText = (value: number, units: UnitSystem): string =>
  show('conductivity', value, { units, digits: units === 'SI' ? 3 : 2 });

export const conductivityUnit = (units: UnitSystem): string => unitLabel('conductivity', units);

export const millimetresText = (metres: number, units: UnitSystem): string =>
  showWithUnit('dimension', metres, { units, digits: units === 'SI' ? 1 : 3 });

/** Whether every word of a search stands somewhere in the text. */
export function matches(search: string, ...texts: readonly string[]): boolean {
  const text = texts.join(' ').toLowerCase();
  return search
    .toLowerCase()
    .split(/\s+/)
    .every((word) => text.includes(word));
}

const plain: readonly [RegExp, string][] = [
  [/\bmedium-high\b/g, 'medium to high'],
  [/\blow-medium\b/g, 'low to medium'],
  [/\bgap\b/g, 'nothing found'],
  [/\bOD\b/g, 'outside diameter'],
];

/** How sure a row is, in plain words: "high (outside diameter), medium to high (walls)". */
export const confidenceText = (confidence: string): string =>
  plain.reduce((words, [pattern, text]) => words.replace(pattern, text), confidence);
