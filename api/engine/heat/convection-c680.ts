import { type Air, airAt } from './air';
import { nusseltCrossFlow, nusseltPlate } from './forced-convection';
import {
  nusseltHorizontalCylinder,
  nusseltHorizontalPlate,
  nusseltVerticalPlate,
  rayleigh,
} from './natural-convection';
import type { Convection, Surface } from './surface';

/**
 * Convection by the practice of ASTM C680: natural and forced coefficients, each on its own length with air at film
 * temperature, combined as hⁿ = h_forcedⁿ + h_naturalⁿ, n = 4 for horizontal cylinders, 3 for vertical surfaces and
 * vertical pipes, 7/2 for horizontal plates.
 *
 * @returns the coefficient for a difference of surface to air [K]
 * @source textbook correlations named at each; combination Incropera et al., 6th ed., sec. 9.9 and ASTM C680-03a and
 *   later from memory of the standard
 */
export function c680Convection(surface: Surface): Convection {
  const { air, wind, pressureRatio } = surface;
  return (difference) => {
    const film = air + difference / 2;
    const properties = airAt(film, pressureRatio);
    const natural = naturalCoefficient(surface, properties, { film, difference });
    return wind > 0 ? combined(surface.shape, forcedCoefficient(surface, properties), natural) : natural;
  };
}

/** Natural part [W/(m²·K)], with air at the film temperature [K]. */
export function naturalCoefficient(
  { shape, diameter, length }: Surface,
  air: Air,
  { film, difference }: { film: number; difference: number },
): number {
  const on = shape === 'horizontal-cylinder' ? diameter : length;
  const ra = rayleigh(air, film, { difference, length: on });
  return (naturalNusselt(shape, ra, { prandtl: air.prandtl, difference }) * air.conductivity) / on;
}

function naturalNusselt(
  shape: Surface['shape'],
  ra: number,
  { prandtl, difference }: { prandtl: number; difference: number },
): number {
  if (shape === 'horizontal-cylinder') return nusseltHorizontalCylinder(ra, prandtl);
  if (shape === 'horizontal-flat-up') return nusseltHorizontalPlate(ra, difference > 0);
  if (shape === 'horizontal-flat-down') return nusseltHorizontalPlate(ra, difference < 0);
  return nusseltVerticalPlate(ra, prandtl);
}

/** Forced part [W/(m²·K)]. */
export function forcedCoefficient({ shape, windLength, wind }: Surface, air: Air): number {
  const reynolds = (wind * windLength) / air.viscosity;
  const nusselt = shape.endsWith('cylinder') ? nusseltCrossFlow : nusseltPlate;
  return (nusselt(reynolds, air.prandtl) * air.conductivity) / windLength;
}

/** Coefficients are combined, not Nusselt numbers: their lengths can differ. */
export function combined(shape: Surface['shape'], forced: number, natural: number): number {
  if (shape === 'horizontal-cylinder')
    return Math.sqrt(Math.sqrt(forced * forced * forced * forced + natural * natural * natural * natural));
  if (shape.startsWith('vertical')) return Math.cbrt(forced * forced * forced + natural * natural * natural);
  return (forced ** 3.5 + natural ** 3.5) ** (2 / 7);
}
