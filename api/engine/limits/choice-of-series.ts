import type { Material, SeriesForm } from '../standards/rows';
import type { ThicknessName } from '../standards/thickness-name';
import { findSeries, isMadeFor, type MadeSeries } from '../standards/thickness-series';
import type { Body } from './study-types';

/** What is left of a wrap once put up: makers allow at most 25 % of compression. */
export const wrapShare = 0.75;

/** Forms that a body can take, the usual before the makeshift. */
const formsFor: Record<Body['shape'], readonly (readonly SeriesForm[])[]> = {
  pipe: [
    ['section', 'tube'],
    ['sheet', 'mat', 'blanket'],
  ],
  'round-duct': [['blanket', 'sheet', 'mat'], ['section', 'tube'], ['liner']],
  'rectangular-duct': [['board', 'blanket', 'sheet', 'mat'], ['liner']],
  vessel: [['board', 'blanket', 'sheet', 'mat'], ['section']],
  flat: [['board', 'blanket', 'sheet', 'mat']],
};

/**
 * Names of a material that are made for a body, in the unit asked for, else in the other.
 *
 * @param diameter - bare outside diameter of the cylinder [m]; null for flats
 * @returns empty when nothing is made in a form that this body takes
 */
export function madeNames(
  material: Material,
  body: Body,
  { unit, diameter }: { unit: 'in' | 'mm'; diameter: number | null },
): ThicknessName[] {
  for (const wanted of [unit, unit === 'in' ? 'mm' : 'in'] as const) {
    for (const forms of formsFor[body.shape]) {
      const series = seriesOf(material).filter((made) => made.unit === wanted && forms.includes(made.form));
      const names = series.flatMap((made) => fitting(made, diameter));
      if (names.length > 0) return [...new Set(names)];
    }
  }
  return [];
}

const fitting = (series: MadeSeries, diameter: number | null): ThicknessName[] =>
  series.names.filter((name) => diameter === null || isMadeFor(series, name, diameter));

/** Which tables of made diameters a material's pipe insulation follows in the name's unit. */
export function pipeTables(material: Material, name: ThicknessName): MadeSeries['tables'] {
  const unit = name.startsWith('in:') ? 'in' : 'mm';
  const series = seriesOf(material).filter((made) => made.unit === unit && made.tables !== 'none');
  return series[0]?.tables ?? 'none';
}

/** Wrap gives way when it is put up. */
export const isWrap = (material: Material, name: ThicknessName): boolean => {
  const unit = name.startsWith('in:') ? 'in' : 'mm';
  return seriesOf(material).some((made) => made.unit === unit && made.installed !== null);
};

const seriesOf = (material: Material): MadeSeries[] =>
  material.series.flatMap((id) => {
    const series = findSeries(id);
    return series ? [series] : [];
  });
