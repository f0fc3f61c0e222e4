import type { ScaleLinear } from 'd3-scale';
import { line } from 'd3-shape';

import { rounded } from './outlines';
import { extentOf, sectionToScale, type SectionDrawing, type SectionInput } from './section';
import { scaleOf } from './strip-scale';

/** Thicknesses side by side: their sections, what changes with them, and the levels it must keep to, in the units that are shown. */
export type StripInput = {
  sections: readonly SectionInput[];
  curves: readonly { id: string; values: readonly (number | null)[] }[];
  levels: readonly { id: string; value: number }[];
};

/** Room for the strip: its width, the least width of a column, the height of the plot, and of the tallest section. */
export type StripRoom = { width: number; least: number; plot: number; tallest: number };

export type StripPoint = {
  x: number;
  y: number;
  value: number;
  /** beyond the scale: said with an arrow at its edge */
  off: 'above' | 'below' | null;
  /** where its number stands */
  labelY: number;
};
export type StripCurve = { id: string; path: string; points: (StripPoint | null)[] };
export type StripColumn = { x: number; left: number; drawing: SectionDrawing; drawingLeft: number; drawingTop: number };
export type StripLayout = {
  width: number;
  pitch: number;
  /** the plot's edges and the common base line */
  top: number;
  bottom: number;
  base: number;
  columns: StripColumn[];
  curves: StripCurve[];
  levels: { id: string; y: number }[];
  ticks: { value: number; y: number }[];
};

/** Above the plot room for the numbers beyond it; below it room before the tallest section. */
const above = 26;
const between = 30;

/** Every section at one scale on a common base line, and above each its point on each curve. */
export function strip(input: StripInput, room: StripRoom): StripLayout {
  const count = Math.max(input.sections.length, 1);
  const pitch = Math.max(room.least, room.width / count);
  const [top, bottom] = [above, above + room.plot];
  const base = bottom + between + room.tallest;
  const y = scaleOf(input, [bottom, top]);
  const levels = input.levels.map(({ id, value }) => ({ id, y: rounded(y(value)) }));
  const xs = input.sections.map((_, index) => (index + 0.5) * pitch);
  return {
    width: pitch * count,
    pitch,
    top,
    bottom,
    base,
    columns: columnsOf(input.sections, { pitch, base, tallest: room.tallest }),
    curves: withLabels(
      input.curves.map((curve) => curveOf(curve, xs, y)),
      levels.map((level) => level.y),
    ),
    levels,
    ticks: y.ticks(4).map((value) => ({ value, y: rounded(y(value)) })),
  };
}

type Ground = { pitch: number; base: number; tallest: number };

function columnsOf(sections: readonly SectionInput[], { pitch, base, tallest }: Ground): StripColumn[] {
  const extents = sections.map(extentOf);
  const widest = Math.max(...extents.map(({ width }) => width));
  const highest = Math.max(...extents.map(({ height }) => height));
  const scale = Math.min((pitch - 8) / widest, tallest / highest);
  const detail = Math.max(widest, highest) * scale;
  return sections.map((section, index) => {
    const drawing = sectionToScale(section, scale, detail);
    const x = (index + 0.5) * pitch;
    const { box } = drawing;
    const drawingLeft = rounded(x - box.x - box.width / 2);
    return { x, left: index * pitch, drawing, drawingLeft, drawingTop: rounded(base - box.y - box.height) };
  });
}

type Scale = ScaleLinear<number, number>;

function curveOf({ id, values }: StripInput['curves'][number], xs: readonly number[], y: Scale): StripCurve {
  const points = values.map((value, index) => (value === null ? null : pointOf(value, xs[index]!, y)));
  return { id, path: throughPoints(points) ?? '', points };
}

/** The curve goes through what lies on the scale, straight between thicknesses that are made. */
const throughPoints = line<StripPoint | null>(
  (point) => point?.x ?? 0,
  (point) => point?.y ?? 0,
)
  .defined((point) => point !== null && point.off === null)
  .digits(1);

function pointOf(value: number, x: number, y: Scale): StripPoint {
  const [bottom, top] = edgesOf(y);
  const at = y(value);
  const off = at < top - 0.5 ? 'above' : at > bottom + 0.5 ? 'below' : null;
  const held = Math.min(Math.max(at, top), bottom);
  return { x: rounded(x), y: rounded(held), value, off, labelY: rounded(held) };
}

/** A number stands over its point on a falling curve and under it on a rising one, unless something is there already. */
function withLabels(curves: readonly StripCurve[], levels: readonly number[]): StripCurve[] {
  return curves.map((curve) => {
    const others = curves.filter(({ id }) => id !== curve.id);
    const preferred = isRising(curve) ? [under, over] : [over, under];
    const points = curve.points.map((point, index) => {
      if (!point || point.off) return point;
      const taken = [...levels, ...others.flatMap(({ points }) => points[index]?.y ?? [])];
      const room = (offset: number) => Math.min(clear, ...taken.map((y) => Math.abs(point.y + offset - y)));
      const offset = preferred.toSorted((one, other) => room(other) - room(one))[0]!;
      return { ...point, labelY: rounded(point.y + offset) };
    });
    return { ...curve, points };
  });
}

/** From a point to the middle of its number, and what must be free around that. */
const [over, under, clear] = [-14, 15, 9];
function isRising({ points }: StripCurve): boolean {
  const drawn = points.filter((point) => point !== null);
  return drawn.length > 1 && drawn.at(-1)!.value > drawn[0]!.value;
}
const edgesOf = (y: Scale): [bottom: number, top: number] => [y.range()[0]!, y.range()[1]!];
