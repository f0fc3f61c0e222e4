import { inUnits, show, type UnitSystem } from '@/api/contracts/quantities';
import type { RunStudy } from '@/api/contracts/study';
import type { StripInput } from '@/api/geometry/strip';

import { candidateName, heatText, marksText } from './candidate-words';
import { standingWords, type Standing } from './put-up';
import { curvesOf, levelsOf, sectionsOf, type SurfaceCurve, type SurfaceLevel } from './study-facts';

export type StripFacts = { input: StripInput; curves: SurfaceCurve[]; levels: SurfaceLevel[] };

/** What the strip draws, in the person's units, so that its scale has round numbers. */
export function stripFacts(runStudy: RunStudy, units: UnitSystem): StripFacts {
  const curves = curvesOf(runStudy.study);
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

/** "touch limit 60 °C", "dew point 28.4 °C". */
export function levelText({ name, value }: SurfaceLevel, units: UnitSystem): string {
  const text = show('temperature', value, { units });
  return `${name} ${text.replace(/\.0$/, '')} ${units === 'SI' ? '°C' : '°F'}`;
}

type Said = { runStudy: RunStudy; standing: Standing; units: UnitSystem };

/** One thickness, said out: all that stands over and under its section. */
export function columnText(place: number, { runStudy: { study }, standing, units }: Said): string {
  const candidate = study.candidates[place];
  if (!candidate) return '';
  const surfaces = curvesOf(study).flatMap(({ values }) => {
    const value = values[place];
    return typeof value === 'number'
      ? [`surface ${show('temperature', value, { units })} ${units === 'SI' ? '°C' : '°F'}`]
      : [];
  });
  const words = [...surfaces, heatText(candidate, units, 1), marksText(candidate), ...standingWords(standing, place)];
  return `${candidateName(candidate, units)}: ${words.join(', ')}`;
}
