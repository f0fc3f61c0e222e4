import { EngineError } from '../engine-error';
import { oneOf } from './reading';
import ductTables from './tables/code-ducts.json';
import editions from './tables/code-editions.json';
import pipeTables from './tables/code-pipes.json';

/** A band of a pipe table: fluid [°F], conductivity [Btu·in/(h·ft²·°F)], rating mean [°F], thickness by column [in]. */
export type CodeBand = {
  from: number | null;
  to: number | null;
  fromIncluded: boolean;
  toIncluded: boolean;
  printed: string;
  conductivity: readonly [number, number];
  ratingMean: number;
  thicknesses: readonly number[];
};
export type CodePipeTable = { name: string; source: string; confidence: string; bands: readonly CodeBand[] };
export type CodeColumn = { title: string; from: number; below: number | null };

export type DuctUse = 'both' | 'heating' | 'cooling' | 'return';
export type DuctLocation = { id: string; words: string };
/** Least installed R of a duct [h·ft²·°F/Btu] by zone number and place in `locations`. */
export type CodeDuctTable = {
  name: string;
  source: string;
  confidence: string;
  locations: readonly DuctLocation[];
  values: Partial<Record<DuctUse, readonly { zone: number; R: readonly number[] }[]>>;
};
export type CodeExemption = {
  id: string;
  what: string;
  answer: string;
  clause: string;
  reducesBy: { less_in: number; not_below_in: number } | null;
  source: string;
  confidence: string;
};

export type CodeEdition = {
  id: string;
  title: string;
  pipes: CodePipeTable;
  /** which end of the conductivity range stands in the adjustment */
  end: 'upper' | 'lower';
  endSource: string;
  endConfidence: string;
  ducts: CodeDuctTable | null;
  footnotes: readonly string[];
  exemptions: readonly CodeExemption[];
};

const columns: readonly CodeColumn[] = pipeTables.columns;
const all: readonly CodeEdition[] = editions.map((row) => ({
  id: row.id,
  title: row.title,
  pipes: pipesOf(row.pipeTable, row.pipeTableName),
  end: oneOf(['upper', 'lower'] as const, row.end),
  endSource: row.endSource,
  endConfidence: row.endConfidence,
  ducts: row.ductTable === null ? null : ductsOf(row.ductTable),
  footnotes: row.footnotes,
  exemptions: row.exemptions,
}));
const byId = new Map(all.map((edition) => [edition.id, edition]));

/** Editions whose tables are entered; verify against the adopted edition, local amendments are common. */
export const codeEditions = (): readonly CodeEdition[] => all;

export const findCodeEdition = (id: string): CodeEdition | undefined => byId.get(id);

/** The pipe tables' columns of nominal size [in]. */
export const codeColumns = (): readonly CodeColumn[] => columns;

/** Location classes of an edition's duct table; none where no duct table is entered. */
export const ductLocations = (editionId: string): readonly DuctLocation[] =>
  findCodeEdition(editionId)?.ducts?.locations ?? [];

/** Exceptions of the duct tables, the same for every edition entered. */
export const ductExemptions = (): readonly CodeExemption[] => ductTables.exemptions;

function pipesOf(id: string, name: string): CodePipeTable {
  const tables = pipeTables.tables;
  const table = tables[oneOf(['ashrae-90.1-2013', 'ashrae-90.1-2010', 'iecc', 'title-24'] as const, id)];
  return { name, source: table.source, confidence: table.confidence, bands: table.rows.map(bandOf) };
}

type BandRow = (typeof pipeTables.tables.iecc.rows)[number];

function bandOf(row: BandRow): CodeBand {
  const [low, high] = row.conductivity;
  if (low === undefined || high === undefined) throw new EngineError('A conductivity range has two numbers');
  return { ...row, conductivity: [low, high] };
}

function ductsOf(id: string): CodeDuctTable {
  return ductTables[oneOf(['ashrae-90.1-2010', 'ashrae-90.1-2016', 'iecc'] as const, id)];
}
