import { EngineError } from '../engine-error';

/**
 * Finished surface of straight cylinder: π · D · L
 *
 * @param outsideDiameter - D, made outside diameter of the finished insulation [m]
 * @param length - L, net along the centre line [m]
 * @returns [m²], not rounded
 * @throws EngineError when a length is negative or no number
 * @source geometry; the outer surface of the finished insulation is the common rule of measurement
 */
export const cylinderArea = (outsideDiameter: number, length: number): number =>
  Math.PI * size(outsideDiameter, 'outsideDiameter') * size(length, 'length');

/**
 * Finished surface of board on a rectangular duct: (P + 8t) · L, P = 2 (w + h); the four corners overlap.
 *
 * @param width - w of the metal [m]
 * @param height - h of the metal [m]
 * @param thickness - t as put up [m]
 * @param length - L, net [m]
 * @returns [m²], not rounded
 * @throws EngineError when a length is negative or no number
 * @source geometry
 */
export function rectangularDuctArea(duct: {
  width: number;
  height: number;
  thickness: number;
  length: number;
}): number {
  const perimeter = 2 * (size(duct.width, 'width') + size(duct.height, 'height'));
  return (perimeter + 8 * size(duct.thickness, 'thickness')) * size(duct.length, 'length');
}

/** How often an end's projected plan area counts. */
const endFactor = { none: 0, flat: 1, domed: 2 } as const;

/**
 * Finished surface of a vessel: shell π · D · L and two ends, flat ones by their plan area π D² / 4, domed ones by twice
 * that.
 *
 * @param outsideDiameter - D of the finished insulation [m]
 * @param length - L of the shell [m]
 * @returns [m²], not rounded
 * @throws EngineError when a length is negative or no number
 * @source IS 14164, mode of measurement, as restated publicly (domed ends as twice the projected plan area)
 */
export function vesselArea(vessel: { outsideDiameter: number; length: number; ends: keyof typeof endFactor }): number {
  const end = (Math.PI * vessel.outsideDiameter ** 2) / 4;
  return cylinderArea(vessel.outsideDiameter, vessel.length) + 2 * endFactor[vessel.ends] * end;
}

/**
 * Finished surface of equal flat areas: measured area × count.
 *
 * @param area - of one [m²]
 * @returns [m²], not rounded
 * @throws EngineError when the area is negative or no number
 * @source as measured
 */
export const flatArea = (area: number, count: number): number => size(area, 'area') * size(count, 'count');

function size(value: number, field: string): number {
  if (value >= 0 && value < Infinity) return value;
  throw new EngineError(`${field} must be a length of at least 0, got ${value}`, field);
}
