import { placeNames } from '@/api/geometry/level-names';
import { sectionToScale, type SectionInput } from '@/api/geometry/section';
import { strip, type StripInput } from '@/api/geometry/strip';

// Surfaces of the demo job's run R30: DN 100 steel, steam at 184 °C, air at 40 °C, bright aluminium.
const thicknesses = [0, 0.025, 0.038, 0.051, 0.064, 0.076, 0.089, 0.102, 0.114, 0.127];
const surfaces = [184, 71.4, 63.1, 58.3, 55.2, 52.7, 51.1, 49.8, 48.6, 47.8];
const sections = thicknesses.map((thickness): SectionInput => ({
  shape: 'cylinder',
  width: 0.1143,
  height: 0.1143,
  layers: thickness > 0 ? [{ materialId: 'std/mf_pipe', thickness }] : [],
  nature: 'hot',
}));
const hot: StripInput = {
  sections,
  curves: [{ id: 'hottest', values: surfaces }],
  levels: [{ id: 'touch', value: 60 }],
};
const room = { width: 780, least: 68, plot: 210, tallest: 84 };

it('draws every section at one scale and on one base line', () => {
  const { columns, base } = strip(hot, room);
  const scales = new Set(columns.map(({ drawing }) => drawing.scale));
  expect(scales.size).toBe(1);
  for (const { drawing, drawingTop } of columns)
    expect(drawingTop + drawing.box.y + drawing.box.height).toBeCloseTo(base, 0);
  expect(columns[3]!.drawing).toEqual(sectionToScale(sections[3]!, [...scales][0]!, columns.at(-1)!.drawing.size - 3));
});

it('lets no section be wider than its column or taller than its room', () => {
  const { columns, pitch } = strip(hot, room);
  expect(pitch).toBe(78);
  for (const { drawing } of columns) {
    expect(drawing.box.width).toBeLessThanOrEqual(pitch);
    expect(drawing.box.height).toBeLessThanOrEqual(room.tallest);
  }
});

it('ties each point to the middle of its section', () => {
  const { columns, curves } = strip(hot, room);
  curves[0]!.points.forEach((point, index) => expect(point!.x).toBeCloseTo(columns[index]!.x, 1));
});

it('draws warmer higher, and the limit between the value over it and the value under it', () => {
  const { curves, levels } = strip(hot, room);
  const ys = curves[0]!.points.slice(1).map((point) => point!.y);
  expect(ys).toEqual(ys.toSorted((one, other) => one - other));
  expect(curves[0]!.points[2]!.y).toBeLessThan(levels[0]!.y);
  expect(curves[0]!.points[3]!.y).toBeGreaterThan(levels[0]!.y);
});

it('says a bare pipe of 184 °C with an arrow at the edge, so that one degree can still be read', () => {
  const { curves, top, ticks } = strip(hot, room);
  expect(curves[0]!.points[0]).toMatchObject({ off: 'above', y: top, value: 184 });
  expect(curves[0]!.points.slice(1).every((point) => point!.off === null)).toBe(true);
  expect(Math.abs(ticks[1]!.y - ticks[0]!.y) / (ticks[1]!.value - ticks[0]!.value)).toBeGreaterThan(3);
});

it('puts no number on a limit', () => {
  const { curves, levels } = strip(hot, room);
  for (const point of curves[0]!.points)
    if (!point!.off) expect(Math.abs(point!.labelY - levels[0]!.y)).toBeGreaterThan(8);
});

it('reads a rising curve too: chilled water, with dew point and margin on the scale', () => {
  const cold: StripInput = {
    sections: sections.slice(0, 5),
    curves: [{ id: 'mostHumid', values: [8, 27.5, 29.1, 29.9, 30.4] }],
    levels: [
      { id: 'dew-point', value: 29.2 },
      { id: 'limit', value: 30.2 },
    ],
  };
  const { curves, levels } = strip(cold, room);
  expect(curves[0]!.points[0]!.off).toBe('below');
  expect(levels[1]!.y).toBeLessThan(levels[0]!.y);
  expect(curves[0]!.points[4]!.y).toBeLessThan(levels[1]!.y);
});

it('leaves out what is not known', () => {
  const { curves } = strip(
    { ...hot, curves: [{ id: 'hottest', values: surfaces.map((value, index) => (index === 4 ? null : value)) }] },
    room,
  );
  expect(curves[0]!.points[4]).toBeNull();
});

it('scrolls rather than squeezes: columns keep their least width', () => {
  expect(strip(hot, { ...room, width: 390, least: 128 }).width).toBe(1280);
});

it('names a level where no number stands, else at its other end or under its line', () => {
  const layout = strip(hot, room);
  const [level] = layout.levels;
  expect(placeNames(layout, [{ id: 'touch', width: 110, end: 'right' }])).toEqual([
    { id: 'touch', end: 'right', top: level!.y - 20 },
  ]);
  const steady = strip({ ...hot, curves: [{ id: 'hottest', values: surfaces.map(() => 60.1) }] }, room);
  const [beside] = placeNames(steady, [{ id: 'touch', width: 110, end: 'right' }]);
  expect(beside!.top).toBe(steady.levels[0]!.y + 2);
});
