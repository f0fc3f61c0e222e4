import { c680Convection } from './convection-c680';
import { isoConvection } from './convection-iso12241';
import type { HeatCase } from './heat-case';
import { radiativeCoefficient, stefanBoltzmann } from './radiation';
import { pressureRatioAt } from './air';
import type { Convection, Surface } from './surface';

export const zeroCelsius = 273.15;

/** How a surface exchanges heat; every difference is that of the surface above the air [K]. */
export type Exchange = {
  /** given off [W/m²]; negative when taken up */
  flux: (difference: number) => number;
  /** null where the coefficient is given */
  convective: Convection | null;
  radiative: Convection | null;
  /** the surroundings above the air [K] */
  offset: number;
  /** the residual that rounding alone can leave [W/m²] */
  noise: number;
};

/**
 * Heat given off by a surface: q″ = h_cv (T_s − T_a) + h_r (T_s − T_sur), or h (T_s − T_a) where h is given.
 *
 * @param heatCase - checked
 * @param surface - lengths of the finished surface, its air and wind
 * @source ASHRAE Handbook Fundamentals 2021 ch. 23; ASTM C680
 */
export function exchangeOf(heatCase: HeatCase, surface: Surface): Exchange {
  const choice = heatCase.surface;
  if (typeof choice === 'object') {
    const { coefficient } = choice;
    return { flux: (difference) => coefficient * difference, convective: null, radiative: null, offset: 0, noise: 0 };
  }
  const { emittance = 1, airTemperature, surroundingsTemperature = airTemperature } = heatCase;
  const offset = surroundingsTemperature - airTemperature;
  const surroundings = surface.air + offset;
  const convective = choice === 'astm-c680' ? c680Convection(surface) : isoConvection(surface);
  const radiative = radiationOf(emittance, surface.air, surroundings);
  return {
    flux: (difference) => convective(difference) * difference + radiative(difference) * (difference - offset),
    convective,
    radiative,
    offset,
    noise: 1e-12 * emittance * stefanBoltzmann * Math.abs(surroundings ** 4 - surface.air ** 4),
  };
}

const radiationOf = (emittance: number, air: number, surroundings: number): Convection => {
  return (difference) => radiativeCoefficient(emittance, air + difference, surroundings);
};

/** The finished surface of a case, on its finished diameter. */
export function surfaceOf(heatCase: HeatCase, diameter: number): Surface {
  const { shape, airTemperature, windSpeed = 0, altitude = 0 } = heatCase;
  const { isCylinder, power, length, windLength } = lengthsOf(heatCase, diameter);
  return {
    shape,
    isCylinder,
    power,
    length,
    windLength,
    air: airTemperature + zeroCelsius,
    wind: windSpeed,
    pressureRatio: altitude === 0 ? 1 : pressureRatioAt(altitude),
  };
}

type Lengths = Pick<Surface, 'isCylinder' | 'power' | 'length' | 'windLength'>;

function lengthsOf(heatCase: HeatCase, diameter: number): Lengths {
  const { shape, height = 0, characteristicLength = 0, windLength = 0 } = heatCase;
  switch (shape) {
    case 'horizontal-cylinder':
      return { isCylinder: true, power: 4, length: diameter, windLength: diameter };
    case 'vertical-cylinder':
      return { isCylinder: true, power: 3, length: height, windLength: diameter };
    case 'vertical-flat':
      return { isCylinder: false, power: 3, length: height, windLength: height };
    case 'horizontal-flat-up':
    case 'horizontal-flat-down':
      return { isCylinder: false, power: 3.5, length: characteristicLength, windLength };
  }
}
