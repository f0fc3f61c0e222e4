import type { LimitVerdict } from './study-types';
import type { Trial } from './trial';
import { amount, cannotTell, doesNotApply, highestFluid, judged } from './verdict';

/**
 * Touch: the surface at most the place's limit, under the highest fluid, the hottest air, still, with the emittance as
 * new. Wind is never credited; sun is not counted.
 *
 * @returns value, limit [°C] and margin [K]
 * @source the limit names its own source; ASTM C1055 and ISO 13732-1 as its usual ones
 */
export function judgeTouch({ input, solve }: Trial): LimitVerdict {
  const { reach, touchLimit, touchLimitSource } = input.place;
  if (reach === 'nobody') return doesNotApply('touch', ['nobody can reach it']);
  if (touchLimit === null) return cannotTell('touch', ['no touch limit is entered for this place']);
  const { result, judgedAt } = solve({ fluid: highestFluid(input), set: 'hottest', emittance: 'new', isStill: true });
  const surface = result.surfaceTemperature;
  return judged('touch', {
    isMet: surface <= touchLimit,
    because: [
      'the surface reaches ',
      amount('temperature', surface),
      '; the limit is ',
      amount('temperature', touchLimit),
    ],
    value: surface,
    limit: touchLimit,
    margin: touchLimit - surface,
    unit: 'temperature',
    judgedAt,
    source: touchLimitSource,
  });
}
