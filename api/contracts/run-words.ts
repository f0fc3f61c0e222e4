import type { LimitKind } from '@/api/engine/limits/study-types';

import type { FlagKind } from './judgement';
import { showWithUnit, type UnitSystem } from './quantities';
import { fittingKinds, type FittingKind, type Fittings, type RunStatus, type Shape, type ShapeKind } from './run';

/** Trade words, one place for screens, documents and mail. */
export const fittingWords: Record<FittingKind, readonly [one: string, many: string]> = {
  'elbow-90': ['elbow 90°', 'elbows 90°'],
  'elbow-45': ['elbow 45°', 'elbows 45°'],
  tee: ['tee', 'tees'],
  reducer: ['reducer', 'reducers'],
  cap: ['cap', 'caps'],
  'screwed-valve': ['screwed valve', 'screwed valves'],
  'flanged-valve': ['flanged valve', 'flanged valves'],
  'flange-pair': ['flange pair', 'flange pairs'],
  strainer: ['strainer', 'strainers'],
  hanger: ['hanger', 'hangers'],
  elbow: ['elbow', 'elbows'],
  transition: ['transition', 'transitions'],
  'take-off': ['take-off', 'take-offs'],
  'access-door': ['access door', 'access doors'],
};

export const countWords = (kind: FittingKind, count: number): string =>
  `${count} ${fittingWords[kind][count === 1 ? 0 : 1]}`;

/** "9 elbows 90°, 4 tees, 3 flanged valves", in the order of the trade's list. */
export const fittingsText = (fittings: Fittings): string =>
  fittingKinds
    .flatMap((kind) => {
      const count = fittings[kind] ?? 0;
      return count > 0 ? [countWords(kind, count)] : [];
    })
    .join(', ');

export const statusWords: Record<RunStatus, string> = {
  measured: 'measured',
  assumed: 'assumed',
  'by-others': 'by others',
  'on-hold': 'on hold',
};

export const shapeWords: Record<ShapeKind, string> = {
  pipe: 'Pipe or tube',
  'round-duct': 'Round duct',
  'rectangular-duct': 'Rectangular duct',
  vessel: 'Vessel',
  flat: 'Flat surface',
  piece: 'Counted piece',
};

export const limitWords: Record<LimitKind, string> = {
  touch: 'touch',
  'dew-point': 'dew point',
  'energy-code': 'energy code',
  'heat-flow': 'heat flow',
  material: 'material',
};

export const flagWords: Record<FlagKind, string> = {
  ...limitWords,
  hold: 'on hold',
  'not-specified': 'not specified',
  'not-calculated': 'not calculated',
};

const standardWords: Record<string, string> = {
  'asme-steel': 'steel',
  'astm-copper': 'copper tube',
  'en-10255': 'steel EN 10255',
  'en-10220': 'steel EN 10220',
  'en-1057': 'copper EN 1057',
  'cpvc-ips': 'CPVC pipe',
  'pvc-ips': 'PVC pipe',
  'cpvc-cts': 'CPVC tube',
  'pex-cts': 'PEX tube',
};

/** What the size is of: "steel", "copper tube", "duct"... */
export function kindText(shape: Shape): string {
  if (shape.kind === 'pipe')
    return shape.size.standard === 'other' ? 'pipe' : (standardWords[shape.size.standard] ?? '');
  return { 'round-duct': 'round duct', 'rectangular-duct': 'duct', vessel: 'vessel', flat: 'flat', piece: 'piece' }[
    shape.kind
  ];
}

const millimetres = (value: number, units: UnitSystem) =>
  showWithUnit('dimension', value, { units, digits: units === 'SI' ? 0 : 1 });

/** A size in the words of its own standard; diameters in the reader's units. */
export function sizeText(shape: Shape, units: UnitSystem): string {
  switch (shape.kind) {
    case 'pipe':
      return shape.size.standard === 'other'
        ? `Ø ${millimetres(shape.size.outsideDiameter.value, units)}`
        : shape.size.nominal;
    case 'round-duct':
      return `Ø ${millimetres(shape.diameter.value, units)}`;
    case 'rectangular-duct':
      return `${millimetres(shape.width.value, units).replace(/ .*/, '')} × ${millimetres(shape.height.value, units)}`;
    case 'vessel':
      return `Ø ${millimetres(shape.diameter.value, units)} × ${millimetres(shape.length.value, units)}`;
    case 'flat':
      return showWithUnit('area', shape.area.value, { units });
    case 'piece':
      return `${shape.count}`;
  }
}

/** Measured length [m] of a run; null where it has none. */
export const lengthOf = (shape: Shape): number | null =>
  'length' in shape && shape.kind !== 'vessel' ? shape.length.value : null;
