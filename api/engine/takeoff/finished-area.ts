import { EngineError } from '../engine-error';

/**
 * Finished surface of an insulated cylinder: A = π D L
 *
 * @param outsideDiameter - made outside diameter of the insulation [m]
 * @param length - measured length [m]
 * @returns area [m²]
 * @throws EngineError when a dimension is not a positive number
 * @source geometry
 */
export function cylinderArea(outsideDiameter: number, length: number): number {
  return Math.PI * positive(outsideDiameter, 'Outside diameter') * positive(length, 'Length');
}

/** Metal of a rectangular duct and what is put on it [m]. */
export type InsulatedDuct = { width: number; height: number; thickness: number; length: number };

/**
 * Finished surface of an insulated rectangular duct: A = (P + 8 t) L, P = 2 (w + h) the perimeter of the metal
 *
 * @returns area [m²]; corners are square, as board lies
 * @throws EngineError when a dimension is not a positive number
 * @source geometry
 */
export function rectangularDuctArea({ width, height, thickness, length }: InsulatedDuct): number {
  const perimeter = 2 * (positive(width, 'Width') + positive(height, 'Height'));
  return (perimeter + 8 * positive(thickness, 'Thickness')) * positive(length, 'Length');
}

export type InsulatedVessel = { outsideDiameter: number; length: number; ends: 'none' | 'flat' | 'domed' };

/**
 * Finished surface of an insulated vessel with its two ends: A = π D L + 2 Aₑ, where Aₑ = π D²/4 for a flat end and
 * π D²/2 for a domed one, twice its projected plan area
 *
 * @returns area [m²]
 * @throws EngineError when a dimension is not a positive number
 * @source geometry; domed ends as IS 14164, mode of measurement, has them, as restated publicly
 */
export function vesselArea({ outsideDiameter, length, ends }: InsulatedVessel): number {
  const disc = (Math.PI * outsideDiameter ** 2) / 4;
  const endArea = { none: 0, flat: disc, domed: 2 * disc }[ends];
  return cylinderArea(outsideDiameter, length) + 2 * endArea;
}

function positive(value: number, name: string): number {
  if (value > 0 && value < Infinity) return value;
  throw new EngineError(`${name} must be positive, got ${value}`);
}
