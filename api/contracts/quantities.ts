import { z } from 'zod';

/** A person's switch; documents have their own. */
export const unitSystems = ['SI', 'IP'] as const;
export type UnitSystem = (typeof unitSystems)[number];

/** value below the screen = (number shown − offset) × factor */
type Unit = { label: string; words: readonly string[]; factor: number; offset?: number; digits: number };
type Kind = { SI: Unit; IP: Unit; others?: readonly Unit[] };

const metre: Unit = { label: 'm', words: ['m', 'metre', 'metres', 'meter', 'meters'], factor: 1, digits: 1 };
const foot: Unit = { label: 'ft', words: ['ft', "'", 'foot', 'feet'], factor: 0.3048, digits: 1 };
const millimetre: Unit = { label: 'mm', words: ['mm'], factor: 0.001, digits: 1 };
const inch: Unit = { label: 'in', words: ['in', '"', 'inch', 'inches'], factor: 0.0254, digits: 2 };
const centimetre: Unit = { label: 'cm', words: ['cm'], factor: 0.01, digits: 1 };

/** The one table of units. Values below the screen are in the SI unit with factor 1, temperatures in °C. */
export const quantities = {
  length: { SI: metre, IP: foot, others: [millimetre, inch, centimetre] },
  dimension: { SI: millimetre, IP: inch, others: [metre, foot, centimetre] },
  elevation: { SI: metre, IP: foot, others: [millimetre, inch] },
  altitude: { SI: { ...metre, digits: 0 }, IP: { ...foot, digits: 0 } },
  area: {
    SI: { label: 'm²', words: ['m²', 'm2', 'sqm'], factor: 1, digits: 2 },
    IP: { label: 'ft²', words: ['ft²', 'ft2', 'sqft', 'sf'], factor: 0.3048 ** 2, digits: 1 },
  },
  temperature: {
    SI: { label: '°C', words: ['°c', 'c', 'degc'], factor: 1, digits: 1 },
    IP: { label: '°F', words: ['°f', 'f', 'degf'], factor: 5 / 9, offset: 32, digits: 1 },
  },
  difference: {
    SI: { label: 'K', words: ['k', '°c', 'c'], factor: 1, digits: 2 },
    IP: { label: '°F', words: ['°f', 'f'], factor: 5 / 9, digits: 2 },
  },
  speed: {
    SI: { label: 'm/s', words: ['m/s'], factor: 1, digits: 1 },
    IP: { label: 'mph', words: ['mph'], factor: 0.44704, digits: 1 },
  },
  humidity: {
    SI: { label: '%', words: ['%', '%rh', 'rh'], factor: 1, digits: 0 },
    IP: { label: '%', words: ['%', '%rh', 'rh'], factor: 1, digits: 0 },
  },
  hours: {
    SI: { label: 'h', words: ['h', 'hours', 'hour'], factor: 1, digits: 0 },
    IP: { label: 'h', words: ['h', 'hours', 'hour'], factor: 1, digits: 0 },
  },
  heatPerLength: {
    SI: { label: 'W/m', words: ['w/m'], factor: 1, digits: 1 },
    IP: {
      label: 'Btu/(h·ft)',
      words: ['btu/(h·ft)', 'btu/h/ft', 'btu/hft'],
      factor: 0.29307107017 / 0.3048,
      digits: 1,
    },
  },
  heatFlux: {
    SI: { label: 'W/m²', words: ['w/m²', 'w/m2'], factor: 1, digits: 1 },
    IP: { label: 'Btu/(h·ft²)', words: ['btu/(h·ft²)', 'btu/h/ft2'], factor: 0.29307107017 / 0.3048 ** 2, digits: 1 },
  },
  coefficient: {
    SI: { label: 'W/(m²·K)', words: ['w/(m²·k)', 'w/m2k'], factor: 1, digits: 2 },
    IP: { label: 'Btu/(h·ft²·°F)', words: ['btu/(h·ft²·°f)'], factor: 5.678263341, digits: 2 },
  },
  conductivity: {
    SI: { label: 'W/(m·K)', words: ['w/(m·k)', 'w/mk'], factor: 1, digits: 4 },
    IP: { label: 'Btu·in/(h·ft²·°F)', words: ['btu·in/(h·ft²·°f)', 'btu.in/h.ft2.f'], factor: 0.1442278889, digits: 3 },
  },
  resistance: {
    SI: { label: 'm²·K/W', words: ['m²·k/w', 'm2k/w'], factor: 1, digits: 2 },
    IP: { label: 'h·ft²·°F/Btu', words: ['h·ft²·°f/btu', 'r'], factor: 0.1761101838, digits: 1 },
  },
} as const satisfies Record<string, Kind>;
export type QuantityKind = keyof typeof quantities;

const kindOf = (kind: QuantityKind): Kind => quantities[kind];

/** A value in its SI unit, and what was typed for it: the value counts, the words are kept. */
export type Quantity = { value: number; typed?: { text: string; unit: string } };

/** The number as a person reads it in these units, without its unit. */
export const inUnits = (kind: QuantityKind, value: number, units: UnitSystem): number => {
  const { factor, offset = 0 } = kindOf(kind)[units];
  return value / factor + offset;
};

export const unitLabel = (kind: QuantityKind, units: UnitSystem): string => kindOf(kind)[units].label;

/** Rounded text without its unit; digits default to the table's. A minus is a true minus, and zero has none. */
export function show(
  kind: QuantityKind,
  value: number,
  { units, digits }: { units: UnitSystem; digits?: number },
): string {
  const text = inUnits(kind, value, units).toFixed(digits ?? kindOf(kind)[units].digits);
  return Number(text) === 0 ? text.replace('-', '') : text.replace('-', '−');
}

export const showWithUnit = (
  kind: QuantityKind,
  value: number,
  options: { units: UnitSystem; digits?: number },
): string => {
  const label = unitLabel(kind, options.units);
  return `${show(kind, value, options)}${label === '%' ? '' : ' '}${label}`;
};

/** What a field shows for editing: what was typed when it was typed in these units, else the number without needless digits. */
export function editText(kind: QuantityKind, quantity: Quantity | undefined, units: UnitSystem): string {
  if (!quantity) return '';
  if (quantity.typed && quantity.typed.unit === unitLabel(kind, units)) return quantity.typed.text;
  return String(Number(inUnits(kind, quantity.value, units).toPrecision(7)));
}

export type Reading = { quantity: Quantity } | { problem: string };

/** Reads "46", "1,5", "150 ft", "-7 °C"; a number without a unit is in the person's units. */
export function readQuantity(kind: QuantityKind, text: string, units: UnitSystem): Reading {
  const match = /^\s*([-−+]?(?:\d+(?:[.,]\d*)?|[.,]\d+))\s*(.*?)\s*$/.exec(text);
  const number = match ? Number(match[1]!.replace('−', '-').replace(',', '.')) : NaN;
  if (!match || !Number.isFinite(number)) return { problem: 'Must be a number' };
  const unit = match[2] ? unitFromWords(kind, match[2]) : kindOf(kind)[units];
  if (!unit)
    return { problem: `Unit not known here: ${match[2]}. Use ${kindOf(kind).SI.label} or ${kindOf(kind).IP.label}` };
  return { quantity: { value: toValue(number, unit), typed: { text: match[1]!, unit: unit.label } } };
}

const unitsOf = (kind: QuantityKind): Unit[] => [kindOf(kind).SI, kindOf(kind).IP, ...(kindOf(kind).others ?? [])];
const unitFromWords = (kind: QuantityKind, words: string) =>
  unitsOf(kind).find((unit) => unit.words.includes(words.toLowerCase().replaceAll(' ', '')));
const toValue = (number: number, { factor, offset = 0 }: Unit) => (number - offset) * factor;

type Bounds = { min?: number; max?: number; above?: number };

/** The contract of a quantity: finite, within bounds, and what was typed must say the same. */
export function quantitySchema(kind: QuantityKind, bounds: Bounds = {}) {
  const { min = -Infinity, max = Infinity, above = -Infinity } = bounds;
  const value = z
    .number({ error: 'Must be a number' })
    .refine((number) => number >= min && number > above, { error: () => `Must be ${lowest(kind, bounds)}` })
    .refine((number) => number <= max, { error: () => `Must be at most ${both(kind, max)}` });
  const typed = z.object({ text: z.string().max(40), unit: z.string().max(24) }).optional();
  return z.object({ value, typed }).refine((quantity) => saysTheSame(kind, quantity), {
    path: ['typed'],
    error: 'What was typed and the value differ',
  });
}

const lowest = (kind: QuantityKind, { min, above }: Bounds) =>
  above !== undefined ? `more than ${both(kind, above)}` : `at least ${both(kind, min ?? 0)}`;
const both = (kind: QuantityKind, value: number) => {
  const [si, ip] = [showWithUnit(kind, value, { units: 'SI' }), showWithUnit(kind, value, { units: 'IP' })];
  return si === ip ? si : `${si} (${ip})`;
};

function saysTheSame(
  kind: QuantityKind,
  { value, typed }: { value: number; typed?: { text: string; unit: string } },
): boolean {
  if (!typed) return true;
  const reading = readQuantity(kind, `${typed.text} ${typed.unit}`, 'SI');
  return 'quantity' in reading && Math.abs(reading.quantity.value - value) <= 1e-9 * Math.max(1, Math.abs(value));
}
