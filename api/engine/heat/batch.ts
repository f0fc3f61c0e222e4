import { EngineError } from '../engine-error';
import type { CurvePoint } from '../standards/rows';
import { type HeatCase, type HeatLayer, type HeatResult, heatShapes, type SurfaceChoice } from './heat-case';
import { solve } from './solve';

export type BatchAnswer = HeatResult | { error: string };

/**
 * A batch of cases as an engineer hands it over, nothing trusted: each is answered or says what is wrong and in which
 * field; the others are still solved. Unknown keys are refused.
 *
 * @param cases - parsed JSON
 * @returns answers of the same length and order, and how many failed
 * @throws EngineError when it is no array
 * @source `solve` for each
 */
export function answerBatch(cases: unknown): { answers: BatchAnswer[]; failed: number } {
  if (!Array.isArray(cases)) throw new EngineError('The input must be an array of cases');
  const answers = cases.map(answerOne);
  return { answers, failed: answers.filter((answer) => 'error' in answer).length };
}

function answerOne(unread: unknown): BatchAnswer {
  try {
    return solve(readCase(unread));
  } catch (error) {
    if (error instanceof EngineError) return { error: error.message };
    throw error;
  }
}

const caseKeys = [
  'shape',
  'outsideDiameter',
  'height',
  'characteristicLength',
  'windLength',
  'layers',
  'operatingTemperature',
  'airTemperature',
  'surroundingsTemperature',
  'emittance',
  'windSpeed',
  'altitude',
  'surface',
] as const satisfies (keyof HeatCase)[];
const numberKeys = caseKeys.filter((key) => key !== 'shape' && key !== 'layers' && key !== 'surface');

/**
 * A case out of parsed JSON: known keys only, numbers where numbers belong.
 *
 * @throws EngineError naming the field; ranges are the solver's to check
 */
export function readCase(unread: unknown): HeatCase {
  const row = record(unread, { field: 'case', keys: caseKeys });
  const numbers: Partial<Record<(typeof numberKeys)[number], number>> = {};
  for (const key of numberKeys) if (row[key] !== undefined) numbers[key] = numberOf(row[key], key);
  const { operatingTemperature, airTemperature, ...optional } = numbers;
  if (operatingTemperature === undefined)
    throw new EngineError('operatingTemperature is missing', 'operatingTemperature');
  if (airTemperature === undefined) throw new EngineError('airTemperature is missing', 'airTemperature');
  return {
    ...optional,
    operatingTemperature,
    airTemperature,
    shape: shapeOf(row.shape),
    layers: list(row.layers, 'layers').map(readLayer),
    surface: readSurface(row.surface),
  };
}

function shapeOf(unread: unknown): HeatCase['shape'] {
  const shape = heatShapes.find((known) => known === unread);
  if (!shape) throw new EngineError(`shape must be one of ${heatShapes.join(', ')}, got ${shown(unread)}`, 'shape');
  return shape;
}

function readLayer(unread: unknown, place: number): HeatLayer {
  const field = `layers[${place}]`;
  const row = record(unread, { field, keys: ['thickness', 'conductivity'] });
  const conductivity = list(row.conductivity, `${field}.conductivity`).map((point) => readPoint(point, field));
  return { thickness: numberOf(row.thickness, `${field}.thickness`), conductivity };
}

function readPoint(unread: unknown, layer: string): CurvePoint {
  const field = `${layer}.conductivity`;
  const point = list(unread, field);
  if (point.length !== 2) throw new EngineError(`${field}: a point is [mean °C, W/(m·K)], got ${shown(unread)}`, field);
  return [numberOf(point[0], field), numberOf(point[1], field)];
}

function readSurface(unread: unknown): SurfaceChoice {
  if (unread === 'astm-c680' || unread === 'iso-12241') return unread;
  if (typeof unread !== 'object') {
    throw new EngineError(
      `surface must be "astm-c680", "iso-12241" or { "coefficient": number }, got ${shown(unread)}`,
      'surface',
    );
  }
  const row = record(unread, { field: 'surface', keys: ['coefficient'] });
  return { coefficient: numberOf(row.coefficient, 'surface.coefficient') };
}

function record(unread: unknown, { field, keys }: { field: string; keys: readonly string[] }): Record<string, unknown> {
  if (typeof unread !== 'object' || unread === null || Array.isArray(unread)) {
    throw new EngineError(`${field} must be an object, got ${shown(unread)}`, field);
  }
  const row: Record<string, unknown> = { ...unread };
  const unknown = Object.keys(row).find((key) => !keys.includes(key));
  if (unknown !== undefined) throw new EngineError(`${field} has an unknown key: ${unknown}`, unknown);
  return row;
}

function list(unread: unknown, field: string): unknown[] {
  if (Array.isArray(unread)) return unread;
  throw new EngineError(`${field} must be a list, got ${shown(unread)}`, field);
}

function numberOf(unread: unknown, field: string): number {
  if (typeof unread === 'number') return unread;
  throw new EngineError(`${field} must be a number, got ${shown(unread)}`, field);
}

function shown(value: unknown): string {
  const text = JSON.stringify(value) ?? 'nothing';
  return text.length > 80 ? `${text.slice(0, 80)}…` : text;
}
