import type { Air } from './air';

const gravity = 9.80665; // m/s²

/**
 * Rayleigh number Ra = g β ΔT L³ / (ν α), β = 1/T_film and α = ν / Pr
 *
 * @param air - at film temperature
 * @param difference - between surface and air, either sign [K]
 * @param length - L [m]
 * @source F. P. Incropera et al., Fundamentals of Heat and Mass Transfer, 6th ed., Wiley, 2007, sec. 9.2
 */
export const rayleigh = ({ kelvin, viscosity, prandtl }: Air, difference: number, length: number): number =>
  (gravity * Math.abs(difference) * length * length * length * prandtl) / (kelvin * viscosity * viscosity);

/**
 * Long horizontal cylinder, on its diameter: Nu = {0.60 + 0.387 Ra^(1/6) / [1 + (0.559/Pr)^(9/16)]^(8/27)}²
 *
 * @param ra - Rayleigh number, at most 1e12
 * @source S. W. Churchill and H. H. S. Chu, Int. J. Heat Mass Transfer 18 (1975) 1049; ASHRAE Handbook Fundamentals
 *   2021 ch. 4 Table 9
 */
export const nusseltHorizontalCylinder = (ra: number, prandtl: number): number =>
  churchillChu(0.6, ra, 0.559 / prandtl);

/**
 * Vertical plate or wide vertical cylinder, on its height, laminar and turbulent:
 * Nu = {0.825 + 0.387 Ra^(1/6) / [1 + (0.492/Pr)^(9/16)]^(8/27)}²
 *
 * @param ra - Rayleigh number, 0.1 to 1e12
 * @source S. W. Churchill and H. H. S. Chu, Int. J. Heat Mass Transfer 18 (1975) 1323; ASHRAE Handbook Fundamentals
 *   2021 ch. 4 Table 9
 */
export const nusseltVerticalPlate = (ra: number, prandtl: number): number => churchillChu(0.825, ra, 0.492 / prandtl);

/** Roots by square and cube roots: several times faster than powers, and this is where a study spends its time. */
function churchillChu(conduction: number, ra: number, ratio: number): number {
  const sixteenthRoot = Math.sqrt(Math.sqrt(Math.sqrt(Math.sqrt(ratio))));
  const shape = (1 + Math.sqrt(ratio) * sixteenthRoot) ** (8 / 27);
  const root = conduction + (0.387 * Math.cbrt(Math.sqrt(ra))) / shape;
  return root * root;
}

/** Where the formula for air that is driven away steps from laminar to turbulent: Nu from 30.4 to 32.3. */
export const plateSwitch = 1e7;

/**
 * Horizontal plate, on area over perimeter. Air driven away (hot facing up, cold facing down): Nu = 0.54 Ra^¼ below
 * Ra = 1e7, 0.15 Ra^⅓ above. Air held (hot facing down, cold facing up): Nu = 0.27 Ra^¼.
 *
 * @param ra - Rayleigh number, 1e4 to 1e11 driven away, 1e5 to 1e10 held
 * @source W. H. McAdams, Heat Transmission, 3rd ed., 1954, as in Incropera et al. sec. 9.6 and ASHRAE Handbook
 *   Fundamentals 2021 ch. 4 Table 9
 */
export function nusseltHorizontalPlate(ra: number, isDrivenAway: boolean): number {
  if (!isDrivenAway) return 0.27 * Math.sqrt(Math.sqrt(ra));
  return ra < plateSwitch ? 0.54 * Math.sqrt(Math.sqrt(ra)) : 0.15 * Math.cbrt(ra);
}
