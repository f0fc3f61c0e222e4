/** Stefan-Boltzmann constant [W/(m²·K⁴)], CODATA 2018. */
export const stefanBoltzmann = 5.670374419e-8;

/**
 * Radiative coefficient of a grey surface in large surroundings: h_r = ε σ (T_s² + T_sur²)(T_s + T_sur)
 *
 * @param emittance - ε, above 0 and at most 1
 * @param surface - absolute temperature [K]
 * @param surroundings - absolute temperature [K]
 * @returns [W/(m²·K)], for the difference between surface and surroundings
 * @source ASHRAE Handbook Fundamentals 2021 ch. 4 eq. 4; Incropera et al., 6th ed., eq. 1.9
 */
export const radiativeCoefficient = (emittance: number, surface: number, surroundings: number): number =>
  emittance * stefanBoltzmann * (surface * surface + surroundings * surroundings) * (surface + surroundings);
