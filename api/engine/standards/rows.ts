import type { ThicknessName } from './thickness-name';

/** Where a row comes from, and how sure it is; any number's conditions can name both. */
export type Origin = { source: string; confidence: string };

export const pipeStandards = [
  'asme-steel',
  'astm-copper',
  'en-10255',
  'en-10220',
  'en-1057',
  'cpvc-ips',
  'pvc-ips',
  'cpvc-cts',
  'pex-cts',
] as const;
export type PipeStandard = (typeof pipeStandards)[number];

/** A size is a standard and a nominal; outside diameter [m], walls [m] by schedule or type. */
export type PipeSize = Origin & {
  standard: PipeStandard;
  nominal: string;
  dn: number | null;
  nominalInches: number | null;
  outsideDiameter: number;
  walls: { name: string; thickness: number }[];
};

export type SeriesForm = 'section' | 'tube' | 'sheet' | 'board' | 'blanket' | 'liner' | 'mat';
/** A made series: the names that can be bought; `tables` says where made outside diameters stand. */
export type ThicknessSeries = Origin & {
  id: string;
  title: string;
  form: SeriesForm;
  unit: 'in' | 'mm';
  names: ThicknessName[];
  tables: 'rigid' | 'flexible' | 'none';
};

/** Mean temperature [°C] and conductivity [W/(m·K)], temperatures rising. */
export type CurvePoint = readonly [meanTemperature: number, conductivity: number];
export type Curve = Origin & { kind: 'max' | 'typical' | 'design' | 'measured'; points: readonly CurvePoint[] };

export type Material = {
  id: string;
  name: string;
  standards: string;
  useType: string;
  curve: Curve;
  otherCurves: readonly Curve[];
  useMinimum: number | null;
  useMinimumSource: string;
  useMaximum: number | null;
  useMaximumSource: string;
  closedCell: boolean;
  flameSmoke: string | null;
  conductivityTolerance: number | null;
  series: readonly string[];
  notes: readonly string[];
};

export type Finish = Origin & {
  id: string;
  name: string;
  kind: string;
  bare: boolean;
  emittanceNew: number;
  emittanceAged: number;
  emittanceRange: readonly [number, number];
  maximum: number | null;
  maximumSource: string;
};

export const vapourRetarders = ['none', 'sealed-facing', 'closed-cell', 'mastic-and-mesh'] as const;
export type VapourRetarder = (typeof vapourRetarders)[number];
