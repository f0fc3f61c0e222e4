import { show, unitLabel, type QuantityKind, type UnitSystem } from '@/api/contracts/quantities';
import type { ShapeKind } from '@/api/contracts/run';
import { fittingsText, kindText, lengthOf, statusWords } from '@/api/contracts/run-words';
import { thicknessText } from '@/api/contracts/words-text';

import { bareSize, rowSize, type RunRow } from './run-row';
import { runVerdict } from './run-verdict';

/** How a field reads in a column: its text, and what it is sorted by. */
export type RunColumn = {
  width: number;
  /** takes what is left */
  grow?: boolean;
  /** stays when the form stands beside the table */
  always?: boolean;
  numeric?: boolean;
  unit?: QuantityKind;
  text: (row: RunRow, units: UnitSystem) => string;
  /** a quieter word behind it: specified, chosen */
  note?: (row: RunRow) => string;
  sort: (row: RunRow) => string | number;
};

/** How a field is entered; size, fittings, hold and override have controls of their own. */
export type RunEntry = {
  part: 'what' | 'size' | 'where' | 'state';
  control:
    | { kind: 'text'; name: 'number' | 'title' | 'note'; optional?: boolean; multiline?: number }
    | { kind: 'choice'; name: 'serviceId' | 'placeId' | 'levelId' | 'drawingId' | 'status'; optional?: boolean }
    | { kind: 'quantity'; name: string; quantity: QuantityKind; optional?: boolean }
    | { kind: 'count'; name: string }
    | { kind: 'own'; name: 'size' | 'orientation' | 'ends' | 'fittings' | 'hold' };
  shapes?: readonly ShapeKind[];
};

export type RunField = { key: string; label: string; column?: RunColumn; entry?: RunEntry };

const piped: readonly ShapeKind[] = ['pipe', 'round-duct', 'rectangular-duct'];
const surfaceDigits = 1;
const number = (value: number | null | undefined, kind: QuantityKind, units: UnitSystem) =>
  value === null || value === undefined ? '' : show(kind, value, { units, digits: surfaceDigits });
const measureOf = (name: string, quantity: QuantityKind): RunEntry['control'] => ({ kind: 'quantity', name, quantity });
const heatOf = ({ judged }: RunRow) => judged?.heatFlow ?? judged?.flux;

/** The one description of a run: its columns in the table, its fields in the form, in order. */
export const runFields: readonly RunField[] = [
  {
    key: 'number',
    label: 'Run',
    column: { width: 52, always: true, text: ({ run }) => run.number, sort: ({ run }) => run.number },
    entry: { part: 'what', control: { kind: 'text', name: 'number' } },
  },
  {
    key: 'service',
    label: 'Service',
    column: {
      width: 168,
      always: true,
      text: ({ service }) => service?.name ?? '',
      sort: ({ service }) => service?.position ?? 0,
    },
    entry: { part: 'what', control: { kind: 'choice', name: 'serviceId' } },
  },
  {
    key: 'title',
    label: 'Name',
    entry: {
      part: 'what',
      control: { kind: 'text', name: 'title', optional: true },
      shapes: ['vessel', 'flat', 'piece'],
    },
  },
  {
    key: 'size',
    label: 'Size',
    column: {
      width: 150,
      always: true,
      text: (row, units) => (isNamed(row) ? `${rowSize(row, units)} ${kindText(row.run.shape)}` : rowSize(row, units)),
      sort: bareSize,
    },
    entry: { part: 'size', control: { kind: 'own', name: 'size' }, shapes: ['pipe'] },
  },
  {
    key: 'diameter',
    label: 'Diameter',
    entry: { part: 'size', control: measureOf('shape.diameter', 'dimension'), shapes: ['round-duct', 'vessel'] },
  },
  {
    key: 'width',
    label: 'Width',
    entry: { part: 'size', control: measureOf('shape.width', 'dimension'), shapes: ['rectangular-duct'] },
  },
  {
    key: 'height',
    label: 'Height',
    entry: { part: 'size', control: measureOf('shape.height', 'dimension'), shapes: ['rectangular-duct', 'flat'] },
  },
  {
    key: 'area',
    label: 'Area each',
    entry: { part: 'size', control: measureOf('shape.area', 'area'), shapes: ['flat'] },
  },
  {
    key: 'length',
    label: 'Length',
    column: {
      width: 76,
      always: true,
      numeric: true,
      unit: 'length',
      text: ({ run }, units) => number(lengthOf(run.shape), 'length', units),
      sort: ({ run }) => lengthOf(run.shape) ?? 0,
    },
    entry: { part: 'size', control: measureOf('shape.length', 'length'), shapes: piped },
  },
  {
    key: 'vessel-length',
    label: 'Length',
    entry: { part: 'size', control: measureOf('shape.length', 'dimension'), shapes: ['vessel'] },
  },
  {
    key: 'orientation',
    label: 'Lies',
    entry: { part: 'size', control: { kind: 'own', name: 'orientation' }, shapes: ['pipe', 'vessel'] },
  },
  { key: 'ends', label: 'Ends', entry: { part: 'size', control: { kind: 'own', name: 'ends' }, shapes: ['vessel'] } },
  {
    key: 'count',
    label: 'How many',
    entry: { part: 'size', control: { kind: 'count', name: 'shape.count' }, shapes: ['vessel', 'flat', 'piece'] },
  },
  {
    key: 'place',
    label: 'Place',
    column: { width: 150, text: ({ place }) => place?.name ?? '', sort: ({ place }) => place?.name ?? '' },
    entry: { part: 'where', control: { kind: 'choice', name: 'placeId' } },
  },
  { key: 'level', label: 'Level', entry: { part: 'where', control: { kind: 'choice', name: 'levelId' } } },
  {
    key: 'drawing',
    label: 'Drawing',
    entry: { part: 'where', control: { kind: 'choice', name: 'drawingId', optional: true } },
  },
  {
    key: 'elevation',
    label: 'Height above floor',
    entry: { part: 'where', control: { kind: 'quantity', name: 'elevation', quantity: 'elevation', optional: true } },
  },
  {
    key: 'fittings',
    label: 'Fittings',
    column: {
      width: 150,
      grow: true,
      text: ({ run }) => fittingsText(run.fittings),
      sort: ({ run }) => Object.values(run.fittings).reduce((sum, count) => sum + count, 0),
    },
    entry: { part: 'size', control: { kind: 'own', name: 'fittings' }, shapes: piped },
  },
  {
    key: 'thickness',
    label: 'Thickness',
    column: {
      width: 128,
      always: true,
      numeric: true,
      text: ({ judged }, units) => (judged?.names.length ? thicknessText(judged.names, units) : '–'),
      note: ({ judged }) => judged?.assembly?.source ?? '',
      sort: ({ judged }) => judged?.layerThicknesses.reduce((sum, thickness) => sum + thickness, 0) ?? 0,
    },
  },
  {
    key: 'surface',
    label: 'Surface',
    column: {
      width: 80,
      numeric: true,
      unit: 'temperature',
      text: ({ judged }, units) => number(judged?.surface, 'temperature', units),
      sort: ({ judged }) => judged?.surface ?? -Infinity,
    },
  },
  {
    key: 'heat',
    label: 'Heat',
    column: {
      width: 96,
      numeric: true,
      text: (row, units) => heatText(row, units),
      sort: (row) => heatOf(row) ?? -Infinity,
    },
  },
  {
    key: 'limits',
    label: 'Limits',
    column: {
      width: 156,
      always: true,
      text: ({ judged }) => runVerdict(judged).words,
      sort: ({ judged }) => runVerdict(judged).words,
    },
  },
  { key: 'status', label: 'Status', entry: { part: 'state', control: { kind: 'choice', name: 'status' } } },
  { key: 'hold', label: 'Hold', entry: { part: 'state', control: { kind: 'own', name: 'hold' } } },
  {
    key: 'note',
    label: 'Note',
    entry: { part: 'state', control: { kind: 'text', name: 'note', optional: true, multiline: 3 } },
  },
];

/** A pipe's size says little without what pipe it is; a duct's measures speak for themselves. */
const isNamed = ({ run }: RunRow) => run.shape.kind === 'pipe';

/** Per metre for pipes and ducts, per square metre for flats: the unit stands with it, for the column holds both. */
function heatText({ judged }: RunRow, units: UnitSystem): string {
  if (!judged || judged.flux === null) return '';
  const kind = judged.heatFlow === null ? 'heatFlux' : 'heatPerLength';
  return `${number(judged.heatFlow ?? judged.flux, kind, units)} ${unitLabel(kind, units)}`;
}

export type ColumnField = RunField & { column: RunColumn };
export const columnFields = runFields.filter((field): field is ColumnField => field.column !== undefined);

/** "Length m": the unit stands in the head, not in every cell. */
export const columnHead = ({ label, column }: ColumnField, units: UnitSystem): string =>
  column.unit ? `${label} ${unitLabel(column.unit, units)}` : label;

export const statusOptions = Object.entries(statusWords).map(([value, label]) => ({ value, label }));
