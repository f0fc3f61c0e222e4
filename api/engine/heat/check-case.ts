import { EngineError } from '../engine-error';
import type { CurvePoint } from '../standards/rows';
import { heatShapes, type HeatCase, type HeatLayer } from './heat-case';

type Range = { above?: number; min?: number; max: number; unit: string };

const ranges = {
  outsideDiameter: { min: 0.001, max: 20, unit: 'm' },
  height: { min: 0.001, max: 500, unit: 'm' },
  characteristicLength: { min: 0.001, max: 500, unit: 'm' },
  windLength: { min: 0.001, max: 500, unit: 'm' },
  operatingTemperature: { above: -273.15, max: 1200, unit: '°C' },
  airTemperature: { min: -100, max: 300, unit: '°C' },
  surroundingsTemperature: { above: -273.15, max: 1200, unit: '°C' },
  emittance: { above: 0, max: 1, unit: '' },
  windSpeed: { min: 0, max: 100, unit: 'm/s' },
  altitude: { min: -500, max: 9000, unit: 'm' },
} as const satisfies Record<string, Range>;
type Field = keyof typeof ranges;

const thicknessRange: Range = { min: 0.0001, max: 2, unit: 'm' };
const conductivityRange: Range = { above: 0, max: 1000, unit: 'W/(m·K)' };
const meanRange: Range = { above: -273.15, max: 2000, unit: '°C' };
const coefficientRange: Range = { above: 0, max: 10_000, unit: 'W/(m²·K)' };
const mostLayers = 10;
const optionalFields = ['surroundingsTemperature', 'windSpeed', 'altitude'] as const;
const lengths = ['outsideDiameter', 'height', 'characteristicLength', 'windLength'] as const;

/**
 * Refuses a case that cannot be solved, naming what is wrong and the field. The ranges are those of plant and
 * buildings: wide enough for any real case, narrow enough that a slip of a decimal or a kelvin for a degree shows.
 *
 * @throws EngineError with the case's field: not a number, missing, or outside its range
 */
export function checkCase(heatCase: HeatCase): void {
  if (!heatShapes.includes(heatCase.shape)) {
    throw new EngineError(`shape must be one of ${heatShapes.join(', ')}, got ${shown(heatCase.shape)}`, 'shape');
  }
  checkSurface(heatCase);
  needed(heatCase, 'operatingTemperature');
  needed(heatCase, 'airTemperature');
  for (const field of optionalFields) optional(heatCase, field);
  checkGeometry(heatCase);
  checkLayers(heatCase.layers);
}

function checkSurface(heatCase: HeatCase): void {
  const { surface } = heatCase;
  if (surface === 'astm-c680' || surface === 'iso-12241') return needed(heatCase, 'emittance');
  if (typeof surface !== 'object' || surface === null || !('coefficient' in surface)) {
    const known = '"astm-c680", "iso-12241" or { "coefficient": number }';
    throw new EngineError(`surface must be ${known}, got ${shown(surface)}`, 'surface');
  }
  within(surface.coefficient, 'surface.coefficient', coefficientRange);
  if (heatCase.emittance !== 0) optional(heatCase, 'emittance');
}

function checkGeometry(heatCase: HeatCase): void {
  const isGiven = typeof heatCase.surface === 'object';
  for (const field of lengths) optional(heatCase, field);
  const { shape } = heatCase;
  if (shape.endsWith('cylinder')) needed(heatCase, 'outsideDiameter');
  if (isGiven) return;
  if (shape.startsWith('vertical')) needed(heatCase, 'height');
  if (shape.startsWith('horizontal-flat')) {
    needed(heatCase, 'characteristicLength');
    if (heatCase.windSpeed) needed(heatCase, 'windLength');
  }
}

function checkLayers(layers: readonly HeatLayer[]): void {
  if (!Array.isArray(layers)) throw new EngineError(`layers must be a list, got ${shown(layers)}`, 'layers');
  if (layers.length > mostLayers)
    throw new EngineError(`layers: at most ${mostLayers}, got ${layers.length}`, 'layers');
  for (let place = 0; place < layers.length; place += 1) checkLayer(layers[place], place);
}

function checkLayer(layer: HeatLayer | undefined, place: number): void {
  const field = `layers[${place}]`;
  if (typeof layer !== 'object' || layer === null) throw new EngineError(`${field} must be a layer`, field);
  within(layer.thickness, `${field}.thickness`, thicknessRange);
  checkCurve(layer.conductivity, `${field}.conductivity`);
}

/**
 * Refuses a conductivity curve without points, with a point that is no pair of numbers in range, or whose
 * temperatures do not rise.
 *
 * @throws EngineError naming the field
 */
export function checkCurve(points: readonly CurvePoint[], field: string): void {
  if (!Array.isArray(points) || points.length === 0) {
    throw new EngineError(`${field} must have at least one point [mean °C, W/(m·K)]`, field);
  }
  let last = -Infinity;
  for (const point of points) {
    last = checkPoint(point, { field, last });
  }
}

function checkPoint(point: CurvePoint, { field, last }: { field: string; last: number }): number {
  if (!Array.isArray(point) || point.length !== 2) {
    throw new EngineError(`${field} must be a list of points [mean °C, W/(m·K)], got ${shown(point)}`, field);
  }
  within(point[0], field, meanRange);
  within(point[1], field, conductivityRange);
  if (point[0] <= last) {
    throw new EngineError(`${field}: mean temperatures must rise, got ${point[0]} after ${last} °C`, field);
  }
  return point[0];
}

function needed(heatCase: HeatCase, field: Field): void {
  if (heatCase[field] === undefined) throw new EngineError(`${field} is missing for ${heatCase.shape}`, field);
  optional(heatCase, field);
}

function optional(heatCase: HeatCase, field: Field): void {
  const value = heatCase[field];
  if (value !== undefined) within(value, field, ranges[field]);
}

function within(value: number, field: string, range: Range): void {
  const { above = -Infinity, min = -Infinity, max } = range;
  if (typeof value === 'number' && value > above && value >= min && value <= max) return;
  throw new EngineError(`${field} must be ${rangeWords(range)}, got ${shown(value)}`, field);
}

function rangeWords({ above, min, max, unit }: Range): string {
  const end = unit && ` ${unit}`;
  return above === undefined ? `between ${min ?? '-∞'} and ${max}${end}` : `above ${above} and at most ${max}${end}`;
}

const shown = (value: unknown): string =>
  typeof value === 'number' ? String(value) : (JSON.stringify(value) ?? 'nothing');
