import { EngineError } from '../engine-error';

const triplePoint = 0.01; // °C
const zeroCelsius = 273.15;

/**
 * Natural logarithm of the saturation pressure of water vapour in Pa, over ice below 0.01 °C and over water above:
 * ln p = c₁/T + c₂ + c₃T + c₄T² + c₅T³ (+ c₆T⁴) + c₇ ln T
 *
 * @param celsius - −100 to 200 °C
 * @source R. W. Hyland and A. Wexler (1983), as in ASHRAE Handbook Fundamentals 2021 ch. 1 eqs. 5 and 6
 */
function logSaturation(celsius: number): number {
  const t = celsius + zeroCelsius;
  if (celsius < triplePoint) {
    const series = 6.3925247 + t * (-9.677843e-3 + t * (6.2215701e-7 + t * (2.0747825e-9 - t * 9.484024e-13)));
    return -5674.5359 / t + series + 4.1635019 * Math.log(t);
  }
  const series = 1.3914993 + t * (-4.8640239e-2 + t * (4.1764768e-5 - t * 1.4452093e-8));
  return -5800.2206 / t + series + 6.5459673 * Math.log(t);
}

/** Its slope d ln p / dT [1/K], from the same equations. */
function logSlope(celsius: number): number {
  const t = celsius + zeroCelsius;
  if (celsius < triplePoint) {
    const series = -9.677843e-3 + t * (2 * 6.2215701e-7 + t * (3 * 2.0747825e-9 - t * 4 * 9.484024e-13));
    return 5674.5359 / (t * t) + series + 4.1635019 / t;
  }
  const series = -4.8640239e-2 + t * (2 * 4.1764768e-5 - t * 3 * 1.4452093e-8);
  return 5800.2206 / (t * t) + series + 6.5459673 / t;
}

/**
 * Saturation pressure of water vapour [Pa]
 *
 * @param celsius - −100 to 200 °C
 * @source as `logSaturation`
 */
export const saturationPressure = (celsius: number): number => Math.exp(logSaturation(celsius));

/**
 * Dew point (frost point below 0 °C): the temperature whose saturation pressure is the air's vapour pressure,
 * p_ws(t_d) = φ p_ws(t). The logarithm is nearly straight, so Newton's steps from the dry bulb close in on it.
 *
 * @param air - dry bulb [°C]
 * @param humidity - relative humidity φ [%], above 0 and at most 100
 * @throws EngineError when humidity or air are out of range, or the steps do not close
 * @source ASHRAE Handbook Fundamentals 2021 ch. 1
 */
export function dewPoint(air: number, humidity: number): number {
  if (!(humidity > 0 && humidity <= 100)) {
    throw new EngineError(`humidity must be above 0 and at most 100 %, got ${humidity}`, 'humidity');
  }
  if (!(air >= -100 && air <= 200)) throw new EngineError(`air must be between -100 and 200 °C, got ${air}`, 'air');
  const target = logSaturation(air) + Math.log(humidity / 100);
  let celsius = air;
  for (let step = 0; step < 50; step += 1) {
    const change = (logSaturation(celsius) - target) / logSlope(celsius);
    celsius = Math.max(-100, celsius - change);
    if (Math.abs(change) < 1e-9) return celsius;
  }
  throw new EngineError(`The dew point of air at ${air} °C and ${humidity} % was not found`, 'humidity');
}

/**
 * Relative humidity at which a surface begins to sweat: φ = p_ws(t_s) / p_ws(t_a)
 *
 * @returns [%]; null for a surface that is not colder than the air, which never sweats
 * @source ASHRAE Handbook Fundamentals 2021 ch. 1
 */
export function sweatingHumidity(surface: number, air: number): number | null {
  return surface < air ? 100 * Math.exp(logSaturation(surface) - logSaturation(air)) : null;
}
