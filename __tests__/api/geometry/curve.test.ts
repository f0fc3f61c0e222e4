import { curvePlot } from '@/api/geometry/curve';

const size = { width: 600, height: 240 };

// Points of the mineral fibre curve: ASHRAE Handbook Fundamentals 2021 ch.23 Table 8.
const mineralFibre = [
  [-4, 0.034],
  [24, 0.035],
  [93, 0.043],
  [204, 0.061],
  [316, 0.091],
] as const;

it('draws every point inside its frame, warmer to the right, more conductive higher up', () => {
  const { frame, curves } = curvePlot([mineralFibre], size);
  const dots = curves[0]!.dots;
  expect(dots).toHaveLength(mineralFibre.length);
  dots.forEach(({ x, y }, index) => {
    expect(x).toBeGreaterThanOrEqual(frame.left);
    expect(x).toBeLessThanOrEqual(frame.right);
    expect(y).toBeGreaterThanOrEqual(frame.top);
    expect(y).toBeLessThanOrEqual(frame.bottom);
    if (index > 0) expect(x).toBeGreaterThan(dots[index - 1]!.x);
    if (index > 0) expect(y).toBeLessThan(dots[index - 1]!.y);
  });
});

it('puts ticks where their values lie, the upward axis from zero', () => {
  const { up, frame } = curvePlot([mineralFibre], size);
  expect(up[0]).toEqual({ value: 0, at: frame.bottom });
  const [first, second] = [up[1]!, up[2]!];
  const perUnit = (frame.bottom - first.at) / first.value;
  expect(frame.bottom - second.at).toBeCloseTo(perUnit * second.value, 6);
});

it('shows several curves on one scale', () => {
  const flat = [
    [0, 0.02],
    [100, 0.02],
  ] as const;
  const { curves } = curvePlot([mineralFibre, flat], size);
  const [a, b] = curves[1]!.dots;
  expect(a!.y).toBe(b!.y);
  expect(a!.y).toBeGreaterThan(curves[0]!.dots[0]!.y);
});

it('gives one point alone an axis to stand on', () => {
  const { curves, frame } = curvePlot([[[24, 0.04]]], size);
  const dot = curves[0]!.dots[0]!;
  expect(dot.x).toBeGreaterThan(frame.left);
  expect(dot.x).toBeLessThan(frame.right);
});
