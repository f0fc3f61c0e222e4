/**
 * Cylinder in cross-flow, on its diameter, film properties:
 * Nu = 0.3 + 0.62 Re^½ Pr^⅓ / [1 + (0.4/Pr)^⅔]^¼ · [1 + (Re/282000)^(5/8)]^(4/5)
 *
 * @param reynolds - with Re·Pr at least 0.2; below it the formula still runs smoothly to 0.3 and the caller says so
 * @source S. W. Churchill and M. Bernstein, J. Heat Transfer 99 (1977) 300; Incropera et al., 6th ed., eq. 7.54
 */
export function nusseltCrossFlow(reynolds: number, prandtl: number): number {
  const shape = Math.sqrt(Math.sqrt(1 + Math.cbrt((0.4 / prandtl) ** 2)));
  const ratio = reynolds / 282_000;
  const eighthRoot = Math.sqrt(Math.sqrt(Math.sqrt(ratio)));
  const turbulence = (1 + Math.sqrt(ratio) * eighthRoot) ** (4 / 5);
  return 0.3 + ((0.62 * Math.sqrt(reynolds) * Math.cbrt(prandtl)) / shape) * turbulence;
}

/** Where flow along a plate turns turbulent. */
export const transition = 5e5;

/**
 * Flat plate, on its length along the wind: Nu = 0.664 Re^½ Pr^⅓ below Re = 5e5, else (0.037 Re^0.8 − 871) Pr^⅓
 *
 * @param reynolds - at most 1e8
 * @source Incropera et al., Fundamentals of Heat and Mass Transfer, 6th ed., eqs. 7.30 and 7.38
 */
export function nusseltPlate(reynolds: number, prandtl: number): number {
  const shape = reynolds < transition ? 0.664 * Math.sqrt(reynolds) : 0.037 * reynolds ** 0.8 - 871;
  return shape * Math.cbrt(prandtl);
}
