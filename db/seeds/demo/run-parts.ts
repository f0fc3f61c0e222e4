import type { Fittings, Override, Run, RunInput, Shape } from '@/api/contracts/run';

import type { DrawingKey, LevelKey } from './basis';
import type { PlaceKey } from './places';
import type { ServiceKey } from './services';
import { celsius, metres, millimetres, typed } from './typed';

/** A run before it has ids: service, place, level and drawing by key. */
export type DemoRun = Omit<RunInput, 'serviceId' | 'placeId' | 'levelId' | 'drawingId'> & {
  service: ServiceKey;
  place: PlaceKey;
  level: LevelKey;
  drawing: DrawingKey | null;
};

type Common = {
  number: string;
  service: ServiceKey;
  place: PlaceKey;
  level: LevelKey;
  drawing?: DrawingKey;
  title?: string;
  note?: string;
  elevation?: string;
  fittings?: Fittings;
  override?: Override;
  hold?: NonNullable<Run['hold']>;
};
type Pipe = Common & { size: PipeSize; length: string };
type RoundDuct = Common & { diameter: string; length: string };
type RectangularDuct = Common & { width: string; height: string; length: string };
type Vessel = Common & { diameter: string; length: string; orientation: 'horizontal' | 'vertical' };
type Flat = Common & { area: string; height: string; count: number };
type PipeSize = Extract<Shape, { kind: 'pipe' }>['size'];

export const steel = (nominal: string): PipeSize => ({ standard: 'asme-steel', nominal });
export const copper = (nominal: string): PipeSize => ({ standard: 'astm-copper', nominal });

const run = (shape: Shape, common: Common): DemoRun => ({
  number: common.number,
  title: common.title ?? '',
  service: common.service,
  place: common.place,
  level: common.level,
  drawing: common.drawing ?? null,
  shape,
  elevation: common.elevation === undefined ? null : typed('elevation', `${common.elevation} m`),
  fittings: common.fittings ?? {},
  status: common.hold ? 'on-hold' : 'measured',
  hold: common.hold ?? null,
  override: common.override ?? null,
  note: common.note ?? '',
});

export const pipe = ({ size, length, ...common }: Pipe) =>
  run({ kind: 'pipe', size, length: metres(length), orientation: 'horizontal' }, common);

export const roundDuct = ({ diameter, length, ...common }: RoundDuct) =>
  run({ kind: 'round-duct', diameter: millimetres(diameter), length: metres(length) }, common);

export const rectangularDuct = ({ width, height, length, ...common }: RectangularDuct) =>
  run(
    { kind: 'rectangular-duct', width: millimetres(width), height: millimetres(height), length: metres(length) },
    common,
  );

export const vessel = ({ diameter, length, orientation, ...common }: Vessel) =>
  run(
    {
      kind: 'vessel',
      diameter: millimetres(diameter),
      length: millimetres(length),
      orientation,
      ends: 'domed',
      count: 1,
    },
    common,
  );

export const flat = ({ area, height, count, ...common }: Flat) =>
  run({ kind: 'flat', area: typed('area', `${area} m²`), height: millimetres(height), count }, common);

/** A departure from the specification row, and why. */
export const departure = (reason: string, change: Partial<Omit<Override, 'reason'>>): Override => ({
  reason,
  state: null,
  layers: null,
  finishId: null,
  vapourRetarder: null,
  codeExempt: '',
  ...change,
});

type Temperatures = [operating: number, lowest: number, highest: number];
export const coldState = ([operating, lowest, highest]: Temperatures): NonNullable<Override['state']> => ({
  nature: 'cold',
  operating: celsius(operating),
  lowest: celsius(lowest),
  highest: celsius(highest),
});
