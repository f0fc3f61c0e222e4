import type { BodyKind } from '@/api/contracts/build-up';
import type { Takeoff, TakeoffLine } from '@/api/contracts/schedule';
import { millimetreLabel } from '@/api/engine/standards/thickness-name';

/** A takeoff line as it is printed: rounded once, and every total adds what is printed. */
export type PrintedLine = { line: TakeoffLine; length: number | null; area: number | null; count: number | null };
export type Sums = { length: number | null; area: number | null; count: number | null };
export type PrintedService = { service: string; lines: PrintedLine[]; sums: Sums };
export type PrintedKind = { kind: BodyKind; services: PrintedService[]; byThickness: PrintedThickness[]; sums: Sums };
export type PrintedThickness = { material: string; thickness: string; sums: Sums };

export const lengthDigits = 1;
export const areaDigits = 2;

export function printedQuantities({ lines }: Takeoff): PrintedKind[] {
  const kinds: BodyKind[] = ['pipe', 'duct', 'equipment'];
  return kinds
    .map((kind) => printedKind(kind, lines.filter(({ appliesTo }) => appliesTo === kind).map(printed)))
    .filter(({ services }) => services.length > 0);
}

const printed = (line: TakeoffLine): PrintedLine => ({
  line,
  length: line.length === null ? null : rounded(line.length, lengthDigits),
  area: line.area === null ? null : rounded(line.area, areaDigits),
  count: line.count,
});

function printedKind(kind: BodyKind, lines: PrintedLine[]): PrintedKind {
  const services = grouped(lines, ({ line }) => line.service);
  const thicknesses = grouped(lines, ({ line }) => JSON.stringify([line.material, thicknessLabel(line)]));
  return {
    kind,
    services: services.map((group) => ({ service: group[0]!.line.service, lines: group, sums: sumsOf(group) })),
    byThickness: thicknesses.map((group) => ({
      material: group[0]!.line.material,
      thickness: thicknessLabel(group[0]!.line),
      sums: sumsOf(group),
    })),
    sums: sumsOf(lines),
  };
}

/** Layers from the inside out, in the millimetres by which a name is shown. */
export const thicknessLabel = ({ names }: Pick<TakeoffLine, 'names'>): string =>
  names.map(millimetreLabel).join(' + ') || '–';

function grouped(lines: PrintedLine[], key: (line: PrintedLine) => string): PrintedLine[][] {
  const groups = new Map<string, PrintedLine[]>();
  for (const line of lines) groups.set(key(line), [...(groups.get(key(line)) ?? []), line]);
  return [...groups.values()];
}

const sumsOf = (lines: PrintedLine[]): Sums => ({
  length: sum(
    lines.map(({ length }) => length),
    lengthDigits,
  ),
  area: sum(
    lines.map(({ area }) => area),
    areaDigits,
  ),
  count: sum(
    lines.map(({ count }) => count),
    0,
  ),
});

/** Adds whole steps of the last printed digit, so that no binary fraction creeps in. */
function sum(values: (number | null)[], digits: number): number | null {
  const present = values.flatMap((value) => value ?? []);
  if (present.length === 0) return null;
  return present.reduce((total, value) => total + Math.round(value * 10 ** digits), 0) / 10 ** digits;
}

const rounded = (value: number, digits: number) => Number(value.toFixed(digits));
