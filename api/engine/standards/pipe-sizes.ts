import { oneOf, metres } from './reading';
import { type PipeSize, type PipeStandard, pipeStandards } from './rows';
import tables from './tables/pipes.json';

type Row = {
  nominal: string;
  dn: number | null;
  inches: number | null;
  outside: number;
  walls: readonly (number | null)[];
  source?: string;
  confidence?: string;
};
type Table = { title: string; source: string; confidence: string; walls: readonly string[]; rows: readonly Row[] };

const tableOf: Record<PipeStandard, Table> = tables;
const sizes: readonly PipeSize[] = Object.keys(tables).flatMap((name) => sizesOf(oneOf(pipeStandards, name)));
const bySize = new Map(sizes.map((size) => [`${size.standard} ${size.nominal}`, size]));

/** Every pipe and tube size of the library. */
export const pipeSizes = (): readonly PipeSize[] => sizes;

/** A size is a standard and a nominal, never a number alone: DN 65 is 73.0 mm (ASME) or 76.1 mm (EN). */
export const findPipeSize = (standard: PipeStandard, nominal: string): PipeSize | undefined =>
  bySize.get(`${standard} ${nominal}`);

export const pipeStandardTitle = (standard: PipeStandard): string => tableOf[standard].title;

function sizesOf(standard: PipeStandard): PipeSize[] {
  const table = tableOf[standard];
  return table.rows.map((row) => ({
    standard,
    nominal: row.nominal,
    dn: row.dn,
    nominalInches: row.inches,
    outsideDiameter: metres(row.outside),
    walls: wallsOf(table.walls, row.walls),
    source: row.source ?? table.source,
    confidence: row.confidence ?? table.confidence,
  }));
}

function wallsOf(names: readonly string[], walls: readonly (number | null)[]): PipeSize['walls'] {
  return names.flatMap((name, place) => {
    const thickness = walls[place];
    return thickness ? [{ name, thickness: metres(thickness) }] : [];
  });
}
