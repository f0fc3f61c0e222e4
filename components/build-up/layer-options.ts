import type { LibraryMaterial, LibrarySeries } from '@/api/contracts/library';
import type { UnitSystem } from '@/api/contracts/quantities';
import { thicknessText } from '@/api/contracts/words-text';
import type { Option } from '@/components/ui/select';

export const notStocked = 'Not stocked in this material';

type Name = LibrarySeries['names'][number];

export type LayerLibrary = {
  materials: readonly LibraryMaterial[];
  series: readonly LibrarySeries[];
  units: UnitSystem;
  /** the job's own series stand first */
  seriesUnit: 'in' | 'mm';
};

/** "51 mm, 2 in": a name says which series it is of, since 2 in and 50 mm are two things. */
export function nameText(name: Name, units: UnitSystem): string {
  const shown = thicknessText([name], units);
  return units === 'SI' && name.startsWith('in:') ? `${shown}, ${thicknessText([name], 'IP')}` : shown;
}

/** The thicknesses that this material is made in, then what is made in others: a specification may ask for either. */
export function thicknessOptions(materialId: string, { materials, series, units, seriesUnit }: LayerLibrary): Option[] {
  const own = materials.find(({ id }) => id === materialId)?.series ?? [];
  const isOfJob = ({ unit }: LibrarySeries) => (unit === seriesUnit ? 0 : 1);
  const made = series.filter(({ id }) => own.includes(id)).sort((a, b) => isOfJob(a) - isOfJob(b));
  const seen = new Set<string>();
  const listed = (names: readonly Name[], group: string): Option[] =>
    names
      .filter((name) => !seen.has(name) && seen.add(name))
      .map((name) => ({ value: name, label: nameText(name, units), group }));
  const inMaterial = made.flatMap(({ names, title }) => listed(names, title));
  const others = series.filter(({ unit }) => unit === seriesUnit).flatMap(({ names }) => names);
  return [...inMaterial, ...listed([...others].sort(byThickness), notStocked)];
}

const byThickness = (a: Name, b: Name) => metresOf(a) - metresOf(b);

/** A name's nominal thickness [m]: for order and for drawing, never for comparing names. */
export const metresOf = (name: Name): number => Number(name.slice(3)) * (name.startsWith('in:') ? 0.0254 : 0.001);

/** Whether a layer of it gets thinner when it is put up, so that the thickness as put up may be stated. */
export function isCompressed(materialId: string, { materials, series }: LayerLibrary): boolean {
  const own = materials.find(({ id }) => id === materialId)?.series ?? [];
  return series.some(({ id, installed }) => own.includes(id) && installed !== null);
}
