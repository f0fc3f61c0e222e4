import type { JobData } from '@/api/contracts/job-data';
import type { ConditionsOfPlace, Place } from '@/api/contracts/place';
import type { Run, Shape } from '@/api/contracts/run';
import type { FluidStateOfService, Service, ServiceLimit } from '@/api/contracts/service';
import { EngineError } from '@/api/engine/engine-error';
import type { Body, Conditions, FluidState, LimitInput, PlaceInput, StudyInput } from '@/api/engine/limits/study-types';
import { finish, material } from '@/api/engine/standards/library';

import type { Assembled } from './assembly';
import { standardSize } from './sizes';

/** What the engine is asked about a run; null for a counted piece, which has no shape to judge. */
export function studyInput(data: JobData, run: Run, assembled: Assembled): StudyInput | null {
  const body = bodyOf(run.shape);
  if (!body) return null;
  const { job } = data;
  const service = found(data.services, run.serviceId, 'service');
  return {
    body,
    layers: assembled.layers.map(({ materialId, thickness, installed }) => ({
      material: material(materialId),
      thickness,
      installed: installed?.value ?? null,
    })),
    finish: finish(assembled.finishId),
    vapourRetarder: assembled.vapourRetarder,
    states: (run.override?.state ? [run.override.state] : service.states).map(fluidState),
    place: placeInput(found(data.places, run.placeId, 'place')),
    limits: limitsAt(service, run.placeId),
    codeEdition: job.codeEdition,
    climateZone: job.climateZone,
    codeExempt: assembled.codeExempt || null,
    altitude: job.altitude.value,
    method: job.surfaceMethod,
    seriesUnit: job.seriesUnit,
  };
}

/** Names a case within one job: runs with equal keys are solved once. */
export const caseKey = (input: StudyInput, placeId: string): string =>
  JSON.stringify([
    input.body,
    input.layers.map((layer) => [layer.material.id, layer.thickness, layer.installed]),
    input.finish.id,
    input.vapourRetarder,
    input.states,
    placeId,
    input.limits,
    input.codeExempt,
  ]);

function bodyOf(shape: Shape): Body | null {
  switch (shape.kind) {
    case 'pipe':
      return pipeBody(shape);
    case 'round-duct':
      return { shape: 'round-duct', diameter: shape.diameter.value };
    case 'rectangular-duct':
      return { shape: 'rectangular-duct', width: shape.width.value, height: shape.height.value };
    case 'vessel':
      return {
        shape: 'vessel',
        diameter: shape.diameter.value,
        length: shape.length.value,
        orientation: shape.orientation,
      };
    case 'flat':
      return { shape: 'flat', height: shape.height.value };
    case 'piece':
      return null;
  }
}

function pipeBody(shape: Extract<Shape, { kind: 'pipe' }>): Body {
  const { size, orientation } = shape;
  const common = {
    shape: 'pipe',
    orientation,
    height: orientation === 'vertical' ? shape.length.value : null,
  } as const;
  if (size.standard === 'other')
    return { ...common, standard: null, nominal: null, outsideDiameter: size.outsideDiameter.value };
  const row = standardSize(shape);
  if (!row) throw new EngineError(`${size.nominal} is no size of its standard`, 'size');
  return { ...common, standard: row.standard, nominal: row.nominal, outsideDiameter: row.outsideDiameter };
}

/** A limit of the service here: one for this place alone goes before one for everywhere. */
export function limitsAt(service: Service, placeId: string): LimitInput[] {
  const applying = service.limits.filter((limit) => limit.placeId === null || limit.placeId === placeId);
  const isOutdone = (limit: ServiceLimit) =>
    limit.placeId === null && applying.some(({ kind, placeId: own }) => kind === limit.kind && own !== null);
  return applying.filter((limit) => !isOutdone(limit)).map(limitInput);
}

function limitInput(limit: ServiceLimit): LimitInput {
  if (limit.kind === 'dew-point') return { kind: limit.kind, margin: limit.margin.value };
  if (limit.kind === 'heat-flow')
    return { kind: limit.kind, perLength: limit.perLength?.value ?? null, flux: limit.flux?.value ?? null };
  return { kind: limit.kind };
}

const fluidState = ({ nature, operating, lowest, highest }: FluidStateOfService): FluidState => ({
  nature,
  operating: operating.value,
  lowest: lowest.value,
  highest: highest.value,
});

const placeInput = ({ conditions, touchLimit, ...place }: Place): PlaceInput => ({
  name: place.name,
  reach: place.reach,
  touchLimit: touchLimit?.value ?? null,
  touchLimitSource: place.touchLimitSource,
  outdoor: place.outdoor,
  plenum: place.plenum,
  ductLocation: place.ductLocation,
  conditions: {
    hottest: air(conditions.hottest),
    mostHumid: air(conditions.mostHumid),
    coldest: air(conditions.coldest),
    warmest: air(conditions.warmest),
    mean: air(conditions.mean),
  },
});
const air = ({ air: dryBulb, humidity, wind, source }: ConditionsOfPlace): Conditions => ({
  air: dryBulb.value,
  humidity: humidity?.value ?? null,
  wind: wind.value,
  source,
});

function found<Row extends { id: string }>(rows: readonly Row[], id: string, noun: string): Row {
  const row = rows.find((candidate) => candidate.id === id);
  if (!row) throw new Error(`The job's data lack the ${noun} ${id}`);
  return row;
}
