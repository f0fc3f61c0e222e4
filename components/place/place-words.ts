import type { ConditionsOfPlace, Place, PlaceInput } from '@/api/contracts/place';
import { inUnits, showWithUnit, type QuantityKind, type UnitSystem } from '@/api/contracts/quantities';

export type SetName = keyof PlaceInput['conditions'];

type SetWords = { name: SetName; title: string; decides: string; isStill: boolean };

/** The five condition sets, and what each one decides. */
export const conditionSetWords: readonly SetWords[] = [
  { name: 'hottest', title: 'Hottest', decides: 'touch, with the fluid at its hottest', isStill: true },
  { name: 'mostHumid', title: 'Most humid', decides: 'dew point, with the fluid at its coldest', isStill: true },
  { name: 'coldest', title: 'Coldest', decides: 'heat flow of hot services', isStill: false },
  { name: 'warmest', title: 'Warmest', decides: 'heat flow of cold services', isStill: false },
  { name: 'mean', title: 'Mean', decides: 'heat flow shown without a limit', isStill: false },
];

export const reachWords: Record<Place['reach'], string> = {
  nobody: 'Out of reach',
  trained: 'Trained people',
  public: 'The public',
};

/** "32 °C", "28 °C at 75%", "−12 °C, wind 6 m/s": only what was given. */
export function airText({ air, humidity, wind }: ConditionsOfPlace, units: UnitSystem): string {
  const degrees = degreesText(air.value, units);
  const damp = humidity ? ` at ${showWithUnit('humidity', humidity.value, { units })}` : '';
  const windy = wind.value > 0 ? `, wind ${plainText('speed', wind.value, units)}` : '';
  return `${degrees}${damp}${windy}`;
}

/** A value with its unit, and a decimal only where there is one. */
export function plainText(kind: QuantityKind, value: number, units: UnitSystem): string {
  const shown = inUnits(kind, value, units);
  const digits = Math.abs(shown - Math.round(shown)) < 0.05 ? 0 : 1;
  return showWithUnit(kind, value, { units, digits });
}

export const degreesText = (celsius: number, units: UnitSystem): string => plainText('temperature', celsius, units);

/** "Trained people, 60 °C", "Out of reach". */
export function touchText({ reach, touchLimit }: Pick<Place, 'reach' | 'touchLimit'>, units: UnitSystem): string {
  if (reach === 'nobody') return reachWords.nobody;
  return touchLimit
    ? `${reachWords[reach]}, ${degreesText(touchLimit.value, units)}`
    : `${reachWords[reach]}, no touch limit`;
}

/** Where it lies, in a few words: what changes how a run here is judged. */
export const situationText = ({ outdoor, plenum }: Pick<Place, 'outdoor' | 'plenum'>): string =>
  [outdoor ? 'outdoors' : 'indoors', ...(plenum ? ['air plenum'] : [])].join(', ');
