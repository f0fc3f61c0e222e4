import type { Study } from '@/api/contracts/study';
import { show, showWithUnit, type UnitSystem } from '@/api/contracts/quantities';

type JudgedAt = Study['candidates'][number]['heat']['judgedAt'];

const setWords: Record<JudgedAt['set'], string> = {
  hottest: 'hottest air',
  mostHumid: 'most humid air',
  coldest: 'coldest air',
  warmest: 'warmest air',
  mean: 'mean air',
};

const degrees = (value: number, units: UnitSystem) =>
  showWithUnit('temperature', value, { units, digits: isWhole(show('temperature', value, { units })) ? 0 : 1 });
const isWhole = (text: string) => text.endsWith('.0');

/** "fluid 184 °C, hottest air 40 °C, still, emittance 0.10": what stands beside every number. */
export function conditionsText({ set, fluid, air, humidity, wind, emittance }: JudgedAt, units: UnitSystem): string {
  return [
    `fluid ${degrees(fluid, units)}`,
    `${setWords[set]} ${degrees(air, units)}${humidity === null ? '' : ` at ${showWithUnit('humidity', humidity, { units })}`}`,
    wind > 0 ? `wind ${showWithUnit('speed', wind, { units })}` : 'still',
    `emittance ${emittance.toFixed(2)}`,
  ].join(', ');
}

/** Without the finish: for the line over a drawing. */
export const shortConditions = (judgedAt: JudgedAt, units: UnitSystem): string =>
  conditionsText(judgedAt, units).replace(/, emittance .*/, '');

export const methodWords: Record<Study['method'], string> = {
  'astm-c680': 'surface by ASTM C680 practice',
  'iso-12241': 'surface by ISO 12241',
};
