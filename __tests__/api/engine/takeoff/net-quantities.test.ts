import { array, assert, double, property } from 'fast-check';

import { exactSum, sumOfNet } from '@/api/engine/takeoff/net-quantities';

it('adds what is there, column by column, and leaves open what no run has', () => {
  const sum = sumOfNet([
    { length: 46, area: 18.35, count: null },
    { length: 58.5, area: null, count: null },
  ]);
  expect(sum).toEqual({ length: 104.5, area: 18.35, count: null });
  expect(sumOfNet([])).toEqual({ length: null, area: null, count: null });
});

it('keeps what a plain sum loses', () => {
  // ten tenths are one; and a small length survives a large one that is taken back
  expect(exactSum(Array.from({ length: 10 }, () => 0.1))).toBe(1);
  expect(exactSum([1, 1e100, 1, -1e100])).toBe(2);
});

it('does not depend on the order of the runs, to the last digit that is printed', () => {
  const lengths = array(double({ min: 0, max: 1e5, noNaN: true }), { minLength: 1, maxLength: 300 });
  assert(
    property(lengths, (values) => {
      expect(exactSum(values)).toBeCloseTo(exactSum([...values].reverse()) ?? NaN, 9);
    }),
  );
});
