import { EngineError } from '../engine-error';
import { checkCurve } from '../heat/check-case';
import { conditionSets, type Conditions, type FluidState, type StudyInput } from './study-types';

/**
 * Refuses what the limits alone would trip over; lengths, temperatures and emittances are checked again by each case.
 *
 * @throws EngineError naming the field
 */
export function checkInput({ states, place, limits, layers, body }: StudyInput): void {
  if (states.length === 0) throw new EngineError('The service has no temperatures', 'states');
  states.forEach(checkState);
  for (const set of conditionSets) checkConditions(place.conditions[set], `${place.name}, ${set}`);
  if (place.touchLimit !== null) finite(place.touchLimit, 'touchLimit');
  for (const limit of limits) if (limit.kind === 'dew-point') finite(limit.margin, 'margin');
  layers.forEach(({ material, installed }, at) => {
    checkCurve(material.curve.points, `layers[${at}].conductivity`);
    if (installed !== null) between(installed, `layers[${at}].installed`, [0.0001, 2]);
  });
  if (body.shape === 'rectangular-duct') between(body.width, 'width', [0.001, 20]);
}

function checkState({ operating, lowest, highest }: FluidState): void {
  for (const value of [operating, lowest, highest]) finite(value, 'states');
  if (lowest > operating || operating > highest) {
    throw new EngineError(
      `The fluid's lowest, operating and highest must rise, got ${lowest}, ${operating}, ${highest} °C`,
      'states',
    );
  }
}

function checkConditions({ air, humidity, wind }: Conditions, name: string): void {
  between(air, `${name}: air`, [-100, 200]);
  between(wind, `${name}: wind`, [0, 100]);
  if (humidity !== null && !(humidity > 0 && humidity <= 100)) {
    throw new EngineError(`${name}: humidity must be above 0 and at most 100 %, got ${humidity}`, 'humidity');
  }
}

const finite = (value: number, field: string): void => between(value, field, [-1e6, 1e6]);

function between(value: number, field: string, [least, most]: readonly [number, number]): void {
  if (typeof value === 'number' && value >= least && value <= most) return;
  throw new EngineError(`${field} must be between ${least} and ${most}, got ${value}`, field);
}
