import { inUnits, quantities, unitLabel, type QuantityKind } from '@/api/contracts/quantities';
import { thicknessText } from '@/api/contracts/words-text';
import type { Words } from '@/api/engine/words';

/** Dates, numbers and sentences as the firm writes them; times are those of the job's zone. SI throughout. */
export function createLocale(tag: string, timeZone: string) {
  const locale = known(tag);
  const formats = new Map<number, Intl.NumberFormat>();
  const formatOf = (digits: number): Intl.NumberFormat => {
    const made =
      formats.get(digits) ??
      new Intl.NumberFormat(locale, {
        minimumFractionDigits: digits,
        maximumFractionDigits: digits,
        signDisplay: 'negative',
      });
    formats.set(digits, made);
    return made;
  };
  const number = (value: number, digits: number): string => formatOf(digits).format(value).replace('-', '−');
  const quantity = (kind: QuantityKind, value: number, digits: number = quantities[kind].SI.digits): string =>
    number(inUnits(kind, value, 'SI'), digits);
  const withUnit = (kind: QuantityKind, value: number, digits?: number): string => {
    const unit = unitLabel(kind, 'SI');
    return `${quantity(kind, value, digits)}${unit === '%' ? '' : '\u00a0'}${unit}`;
  };
  const part = (each: Words[number]): string => {
    if (typeof each === 'string') return each;
    return 'thickness' in each ? thicknessText(each.thickness, 'SI') : withUnit(each.kind, each.value, each.digits);
  };
  return {
    language: locale,
    number,
    quantity,
    withUnit,
    words: (words: Words) => words.map(part).join(''),
    /** a calendar date, as it is: no zone moves it */
    date: (day: string) => new Intl.DateTimeFormat(locale, { ...long, timeZone: 'UTC' }).format(new Date(day)),
    /** the date and time of an instant, in the job's zone */
    moment: (instant: string) =>
      new Intl.DateTimeFormat(locale, {
        ...long,
        hour: '2-digit',
        minute: '2-digit',
        timeZone,
        timeZoneName: 'short',
      }).format(new Date(instant)),
    day: (instant: string) => new Intl.DateTimeFormat(locale, { ...long, timeZone }).format(new Date(instant)),
  };
}
export type Locale = ReturnType<typeof createLocale>;

const long = { day: 'numeric', month: 'long', year: 'numeric' } as const;

function known(tag: string): string {
  try {
    return Intl.NumberFormat.supportedLocalesOf(tag)[0] ?? 'en';
  } catch {
    return 'en';
  }
}
