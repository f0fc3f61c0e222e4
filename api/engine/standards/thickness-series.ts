import { nameOf, oneOf } from './reading';
import type { SeriesForm, ThicknessSeries } from './rows';
import type { ThicknessName } from './thickness-name';
import table from './tables/series.json';

/** A series with what its rows add: `installed` is the share of a name that is left once put up; `sizes` where it is made. */
export type MadeSeries = ThicknessSeries & {
  installed: number | null;
  sizes: string;
  note: string;
  fits: ReadonlyMap<ThicknessName, readonly [from: number, to: number]>;
};

const units = ['in', 'mm'] as const;
const forms = ['section', 'tube', 'sheet', 'board', 'blanket', 'liner', 'mat'] as const satisfies SeriesForm[];
const madeTables = ['rigid', 'flexible', 'none'] as const;

const all: readonly MadeSeries[] = table.map(seriesOf);
const byId = new Map(all.map((series) => [series.id, series]));

/** Every made series of thicknesses. */
export const thicknessSeries = (): readonly MadeSeries[] => all;

export const findSeries = (id: string): MadeSeries | undefined => byId.get(id);

/** Whether a name of a series is made for this outside diameter [m]; where the table gives no range it is. */
export function isMadeFor(series: MadeSeries, name: ThicknessName, outsideDiameter: number): boolean {
  const range = series.fits.get(name);
  return !range || (outsideDiameter >= range[0] && outsideDiameter <= range[1]);
}

function seriesOf(row: (typeof table)[number]): MadeSeries {
  const unit = oneOf(units, row.unit);
  const names = row.names.map((nominal) => nameOf(unit, nominal));
  return {
    id: row.id,
    title: row.title,
    form: oneOf(forms, row.form),
    unit,
    names,
    tables: oneOf(madeTables, row.tables),
    source: row.source,
    confidence: row.confidence,
    installed: row.installed ?? null,
    sizes: row.sizes,
    note: row.note ?? '',
    fits: new Map(names.flatMap((name, place) => rangeOf(name, row.fits?.[place]))),
  };
}

function rangeOf(
  name: ThicknessName,
  range: readonly number[] | undefined,
): [ThicknessName, readonly [number, number]][] {
  const [from, to] = range ?? [];
  return from === undefined || to === undefined ? [] : [[name, [from / 1000, to / 1000]]];
}
