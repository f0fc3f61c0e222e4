import { dewPoint, sweatingHumidity } from './psychrometrics';
import type { LimitVerdict } from './study-types';
import type { Trial } from './trial';
import { amount, cannotTell, judged, lowestFluid } from './verdict';

/**
 * Dew point: the surface at least the dew point plus the margin, under the lowest fluid, the most humid air, still,
 * with the emittance as new. `dry` when it is, `marginal` between dew point and margin, `sweats` at or below.
 *
 * @param margin - above the dew point [K]
 * @returns value and limit [°C], margin [K]; the dew point and the humidity at which sweating begins
 * @source psychrometrics ASHRAE Handbook Fundamentals 2021 ch. 1; the margin is the project's
 */
export function judgeDewPoint({ input, solve }: Trial, margin: number): LimitVerdict {
  const { air, humidity } = input.place.conditions.mostHumid;
  if (humidity === null)
    return cannotTell('dew-point', ['no humidity is entered for the most humid air of this place']);
  const dew = dewPoint(air, humidity);
  const { result, judgedAt } = solve({ fluid: lowestFluid(input), set: 'mostHumid', emittance: 'new', isStill: true });
  const surface = result.surfaceTemperature;
  const left = surface - dew - margin;
  return judged('dew-point', {
    isMet: left >= 0,
    because: ['the surface is at ', amount('temperature', surface), '; the dew point is ', amount('temperature', dew)],
    value: surface,
    limit: dew + margin,
    margin: left,
    unit: 'temperature',
    state: stateOf(surface - dew, margin),
    dewPoint: dew,
    sweatsFrom: sweatingHumidity(surface, air),
    judgedAt,
    source: 'ASHRAE Handbook Fundamentals 2021 ch. 1 (psychrometrics); margin as entered',
  });
}

function stateOf(above: number, margin: number): LimitVerdict['state'] {
  if (above <= 0) return 'sweats';
  return above < margin ? 'marginal' : 'dry';
}
