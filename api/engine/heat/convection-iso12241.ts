import type { Convection, Surface } from './surface';

/** Where the free formulas step up: L³ΔT [m³·K], walls by 60 %, horizontal pipes by 17 %. */
const freeSwitch = 10;

/**
 * Convection by ISO 12241: without wind its free formulas for indoors, with wind its formulas for outdoors but not
 * less than the free ones; the two are never combined. Its constants are for air near sea level.
 * Free, walls and vertical pipes on H: 1.32 (ΔT/H)^¼ up to H³ΔT = 10 m³K, else 1.74 ΔT^⅓; horizontal pipes on D:
 * 1.25 (ΔT/D)^¼, else 1.21 ΔT^⅓. Wind, walls: 3.96 √(v/H) up to vH = 8 m²/s, else 5.76 (v⁴/H)^⅕; pipes:
 * 8.1e-3/D + 3.14 √(v/D) up to vD = 8.55e-3 m²/s, else 8.9 v^0.9 / D^0.1.
 *
 * @returns the coefficient for a difference of surface to air [K]
 * @source ISO 12241, from memory; the pipe constants as quoted from the 2008 edition by a public implementation
 */
export function isoConvection(surface: Surface): Convection {
  const forced = surface.wind > 0 ? isoForced(surface) : 0;
  return (difference) => Math.max(forced, isoFree(surface, Math.abs(difference)));
}

/** Free part [W/(m²·K)]; horizontal flats are taken as walls of their characteristic length, which a note says. */
export function isoFree({ shape, length }: Surface, difference: number): number {
  if (shape === 'horizontal-cylinder') {
    return isLaminar(length, difference) ? 1.25 * fourthRoot(difference / length) : 1.21 * Math.cbrt(difference);
  }
  return isLaminar(length, difference) ? 1.32 * fourthRoot(difference / length) : 1.74 * Math.cbrt(difference);
}

/** Part that wind gives [W/(m²·K)]. */
export function isoForced({ isCylinder, windLength, wind }: Surface): number {
  const product = wind * windLength;
  if (!isCylinder) {
    return product <= 8 ? 3.96 * Math.sqrt(wind / windLength) : 5.76 * (wind ** 4 / windLength) ** (1 / 5);
  }
  return product <= 8.55e-3
    ? 8.1e-3 / windLength + 3.14 * Math.sqrt(wind / windLength)
    : (8.9 * wind ** 0.9) / windLength ** 0.1;
}

const isLaminar = (length: number, difference: number): boolean => length ** 3 * difference <= freeSwitch;
const fourthRoot = (value: number): number => Math.sqrt(Math.sqrt(value));
