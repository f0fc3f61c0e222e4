import { assert, double, property } from 'fast-check';

import { conductivityAt, dropFor, isWithin } from '@/api/engine/heat/conductivity';
import type { CurvePoint } from '@/api/engine/standards/rows';

const curve: readonly CurvePoint[] = [
  [0, 0.03],
  [100, 0.05],
  [200, 0.04],
];

// rules of this engine outside the points
it.each([
  [-50, 0.03],
  [0, 0.03],
  [50, 0.04],
  [150, 0.045],
  [300, 0.04],
])('at %p °C the curve is %p: first value held, a falling end not continued', (temperature, conductivity) => {
  expect(conductivityAt(curve, temperature)).toBeCloseTo(conductivity, 12);
});

it('continues a rising end', () => {
  const rising: readonly CurvePoint[] = [
    [0, 0.03],
    [100, 0.05],
  ];
  expect(conductivityAt(rising, 200)).toBeCloseTo(0.07, 12);
});

it('takes one point as a constant', () => expect(conductivityAt([[24, 0.04]], 400)).toBe(0.04));

/** ∫ k dT by the midpoint rule, fine enough to check a closed form by. */
function integral(from: number, to: number): number {
  const steps = 20_000;
  const width = (from - to) / steps;
  let sum = 0;
  for (let at = 0; at < steps; at += 1) sum += conductivityAt(curve, to + (at + 0.5) * width) * width;
  return sum;
}

it.each([
  [180, 5],
  [5, 180],
  [250, -40],
  [-40, 250],
  [60, 55],
  [100, 0],
  [0, 100],
])('the drop from %p to %p °C is what the integral between them asks for', (from, to) => {
  expect(dropFor(curve, from, integral(from, to))).toBeCloseTo(from - to, 4);
});

it('turns back from where it came', () => {
  const temperature = double({ min: -100, max: 400, noNaN: true });
  const amount = double({ min: -30, max: 30, noNaN: true });
  assert(
    property(temperature, amount, (from, whole) => {
      const drop = dropFor(curve, from, whole);
      expect(drop * whole).toBeGreaterThanOrEqual(0);
      expect(dropFor(curve, from - drop, -whole) + drop).toBeCloseTo(0, 7);
    }),
  );
});

// linear k: the mean is the value at the mean temperature; Incropera et al., 6th ed., problem of variable conductivity
it('gives the value at the mean temperature within one segment', () => {
  const drop = dropFor(curve, 90, 3);
  expect(3 / drop).toBeCloseTo(conductivityAt(curve, 90 - drop / 2), 10);
});

it('knows whether it is within the points', () => {
  expect([
    isWithin(curve, 10, 150),
    isWithin(curve, 150, 10),
    isWithin(curve, -1, 10),
    isWithin(curve, 10, 201),
  ]).toEqual([true, true, false, false]);
});
