import type { PipeStandard } from './rows';
import flexible from './tables/flexible-sizes.json';
import rigid from './tables/rigid-sizes.json';
import { nominalThickness, type ThicknessName } from './thickness-name';

/** The outside diameter [m] of one layer put over an inner one, and whether a table gives it or the nominal was added. */
export type MadeDiameter = { outsideDiameter: number; basis: 'made' | 'nominal'; source: string };
export type Bore = { standard: PipeStandard | null; outsideDiameter: number };

const inch = 0.0254;
const fit = 0.0005; // the tables round to 0.3 mm, EN and ASME steel differ by as much and take the same section
const nestingFit = inch / 32; // to which ASTM C585 measures

const family: Record<PipeStandard, 'pipe' | 'tube' | 'none'> = {
  'asme-steel': 'pipe',
  'en-10255': 'pipe',
  'en-10220': 'pipe',
  'cpvc-ips': 'pipe',
  'pvc-ips': 'pipe',
  'astm-copper': 'tube',
  'cpvc-cts': 'tube',
  'pex-cts': 'tube',
  'en-1057': 'none',
};

/**
 * Outside diameter of a made thickness on a pipe. Tables are in inches or mm as printed; made = inches x 25.4.
 * Where no table has the pipe or the name, the nominal thickness is added on both sides, and the basis says so.
 *
 * @param bore - the pipe: its standard and outside diameter [m]
 * @param name - the made thickness
 * @param tables - which tables the series follows
 * @returns undefined when a table lists the pipe but not this name: it is not made
 * @source ASHRAE Handbook Fundamentals 2021 (SI) ch. 23 Tables 13 to 16; ASTM C585
 */
export function madeDiameter(
  bore: Bore,
  name: ThicknessName,
  tables: 'rigid' | 'flexible' | 'none',
): MadeDiameter | undefined {
  const kind = bore.standard ? family[bore.standard] : 'none';
  if (kind === 'none' || tables === 'none' || name.startsWith('mm:')) return onNominal(bore.outsideDiameter, name);
  return tables === 'rigid' ? rigidOn(kind, bore.outsideDiameter, name) : flexibleOn(kind, bore.outsideDiameter, name);
}

/**
 * Outside diameter of an outer section whose bore is the outside of an inner layer: the section of the larger pipe of
 * that outside diameter.
 *
 * @param inner - outside diameter of the inner layer [m]
 * @returns basis `nominal` when nothing is made to nest there; undefined when the table has the bore but not this name
 * @source ASTM C585-90(2004) sections 4.3 and 5.1 with its Table 13 arithmetic
 */
export function nestedDiameter(
  inner: number,
  name: ThicknessName,
  tables: 'rigid' | 'flexible' | 'none',
): MadeDiameter | undefined {
  const row = rigid.pipe.rows.find(({ pipe }) => Math.abs(pipe * inch - inner) <= nestingFit);
  if (tables !== 'rigid' || name.startsWith('mm:') || !row) return onNominal(inner, name);
  return rigidRow(row, { outsideDiameter: inner, name, source: rigid.nesting.source });
}

export const onNominal = (inner: number, name: ThicknessName): MadeDiameter => ({
  outsideDiameter: inner + 2 * nominalThickness(name),
  basis: 'nominal',
  source: 'nominal thickness added: no made diameter known',
});

function rigidOn(kind: 'pipe' | 'tube', outsideDiameter: number, name: ThicknessName): MadeDiameter | undefined {
  const { rows, source } = rigid[kind];
  const row = rows.find(({ pipe }) => Math.abs(pipe * inch - outsideDiameter) <= fit);
  return row ? rigidRow(row, { outsideDiameter, name, source }) : onNominal(outsideDiameter, name);
}

type RigidRow = (typeof rigid.pipe.rows)[number];
type Asked = { outsideDiameter: number; name: ThicknessName; source: string };

function rigidRow(row: RigidRow, { outsideDiameter, name, source }: Asked): MadeDiameter | undefined {
  const nominal = Number(name.slice(3));
  if (nominal === 0.5) return row.half ? onNominal(outsideDiameter, name) : undefined;
  const made = row.outside[rigid.names.indexOf(nominal)];
  return made ? { outsideDiameter: made * inch, basis: 'made', source } : undefined;
}

function flexibleOn(kind: 'pipe' | 'tube', outsideDiameter: number, name: ThicknessName): MadeDiameter {
  const { rows, source } = flexible[kind];
  const row = rows.find(({ pipe }) => Math.abs(pipe / 1000 - outsideDiameter) <= fit);
  const made = row?.outside[flexible.names.indexOf(Number(name.slice(3)))];
  return made ? { outsideDiameter: made / 1000, basis: 'made', source } : onNominal(outsideDiameter, name);
}
