import { inUnits, showWithUnit, type UnitSystem } from '@/api/contracts/quantities';
import type { StripInput } from '@/api/geometry/strip';

import { candidateName, heatText, marksText } from './candidate-words';
import { standingWords, type Standing } from './put-up';
import { curvesOf, levelsOf, sectionsOf, type StudiedRun, type SurfaceCurve, type SurfaceLevel } from './study-facts';

export type StripFacts = { input: StripInput; curves: SurfaceCurve[]; levels: SurfaceLevel[] };

/** What the strip draws, in the person's units, so that its scale has round numbers. */
export function stripFacts(runStudy: StudiedRun, units: UnitSystem): StripFacts {
  const curves = curvesOf(runStudy);
  const levels = levelsOf(runStudy.study);
  const shown = (value: number) => inUnits('temperature', value, units);
  const input = {
    sections: sectionsOf(runStudy),
    curves: curves.map(({ id, values }) => ({
      id,
      values: values.map((value) => (value === null ? null : shown(value))),
    })),
    levels: levels.map(({ id, value }) => ({ id, value: shown(value) })),
  };
  return { input, curves, levels };
}

const short = (text: string) => text.replace(/\.0+(?=\D|$)/, '');

/** "touch limit 60 °C", "dew point + 1 K: 30.2 °C". */
export function levelText({ name, above, value }: SurfaceLevel, units: UnitSystem): string {
  const degrees = short(showWithUnit('temperature', value, { units }));
  if (above === null) return `${name} ${degrees}`;
  return `${name} + ${short(showWithUnit('difference', above, { units, digits: 1 }))}: ${degrees}`;
}

type Said = { runStudy: StudiedRun; standing: Standing; units: UnitSystem };

/** One thickness, said out: all that stands over and under its section. */
export function columnText(place: number, { runStudy, standing, units }: Said): string {
  const candidate = runStudy.study.candidates[place];
  if (!candidate) return '';
  const surfaces = curvesOf(runStudy).flatMap(({ values }) => {
    const value = values[place];
    return typeof value === 'number' ? [`surface ${showWithUnit('temperature', value, { units })}`] : [];
  });
  const words = [...surfaces, heatText(candidate, units, 1), marksText(candidate), ...standingWords(standing, place)];
  return `${candidateName(candidate, units)}: ${words.join(', ')}`;
}
