/** Absolute temperature [K], thermal conductivity [W/(m·K)], kinematic viscosity [m²/s] and Prandtl number. */
export type Air = { kelvin: number; conductivity: number; viscosity: number; prandtl: number };

const molarMass = 28.97; // kg/kmol
const gasConstant = 287.055; // J/(kg·K)
const seaLevelPressure = 101_325; // Pa

/**
 * Dry air at a temperature and altitude: μ = 1.458e-6 T^1.5 / (T + 110.4), k = 2.64638e-3 T^1.5 / (T + 245.4·10^(-12/T)),
 * ρ = p / (287.055 T), c_p = (28.11 + 0.1967e-2 T + 0.4802e-5 T² − 1.966e-9 T³) / 28.97 kJ/(kg·K), Pr = μ c_p / k.
 * From 250 to 700 K k is within 1.3 %, ν within 2.5 % and Pr within 3.6 % of a reference equation of state.
 *
 * @param kelvin - absolute temperature [K], the film's
 * @param pressureRatio - air pressure over that at sea level
 * @source US Standard Atmosphere 1976 (k, μ); Y. A. Çengel, Thermodynamics, table of ideal-gas specific heats (c_p)
 */
export function airAt(kelvin: number, pressureRatio: number): Air {
  const power = kelvin * Math.sqrt(kelvin);
  const dynamic = (1.458e-6 * power) / (kelvin + 110.4);
  const conductivity = (2.64638e-3 * power) / (kelvin + 245.4 * Math.exp(-27.631021115928547 / kelvin));
  const heatCapacity = (1000 * (28.11 + kelvin * (0.1967e-2 + kelvin * (0.4802e-5 - kelvin * 1.966e-9)))) / molarMass;
  const density = (seaLevelPressure * pressureRatio) / (gasConstant * kelvin);
  return { kelvin, conductivity, viscosity: dynamic / density, prandtl: (dynamic * heatCapacity) / conductivity };
}

/**
 * Pressure of the standard atmosphere over that at sea level: (1 − 2.25577e-5 z)^5.25588
 *
 * @param altitude - z [m], up to 11 000 m
 * @source ASHRAE Handbook Fundamentals 2021 ch. 1, standard atmosphere (2.25577e-5, 5.2559); US Standard Atmosphere 1976
 */
export const pressureRatioAt = (altitude: number): number => (1 - 2.25577e-5 * altitude) ** 5.2559;
