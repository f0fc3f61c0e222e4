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
    const film = airAt(air + difference / 2, pressureRatio);
    const natural = naturalCoefficient(surface, film, difference);
    return wind > 0 ? combined(surface.power, forcedCoefficient(surface, film), natural) : natural;
  };
}

/** Natural part [W/(m²·K)], with air at film temperature. */
export function naturalCoefficient(surface: Surface, film: Air, difference: number): number {
  const ra = rayleigh(film, difference, surface.length);
  return (naturalNusselt(surface, ra, { film, difference }) * film.conductivity) / surface.length;
}

function naturalNusselt({ shape }: Surface, ra: number, at: { film: Air; difference: number }): number {
  switch (shape) {
    case 'horizontal-cylinder':
      return nusseltHorizontalCylinder(ra, at.film.prandtl);
    case 'horizontal-flat-up':
      return nusseltHorizontalPlate(ra, at.difference > 0);
    case 'horizontal-flat-down':
      return nusseltHorizontalPlate(ra, at.difference < 0);
    default:
      return nusseltVerticalPlate(ra, at.film.prandtl);
  }
}

/** Forced part [W/(m²·K)]. */
export function forcedCoefficient({ isCylinder, windLength, wind }: Surface, film: Air): number {
  const reynolds = (wind * windLength) / film.viscosity;
  const nusselt = isCylinder ? nusseltCrossFlow(reynolds, film.prandtl) : nusseltPlate(reynolds, film.prandtl);
  return (nusselt * film.conductivity) / windLength;
}

/** Coefficients are combined, not Nusselt numbers: their lengths can differ. */
function combined(power: Surface['power'], forced: number, natural: number): number {
  if (power === 3) return Math.cbrt(forced * forced * forced + natural * natural * natural);
  if (power === 3.5) return (forced ** 3.5 + natural ** 3.5) ** (2 / 7);
  return Math.sqrt(Math.sqrt(forced * forced * forced * forced + natural * natural * natural * natural));
}
