import { assert, double, property } from 'fast-check';

import { cylinderArea, rectangularDuctArea, vesselArea } from '@/api/engine/takeoff/finished-area';

// geometry: no source but the figures themselves
it('unrolls a cylinder', () => {
  expect(cylinderArea(1, 1)).toBeCloseTo(3.14159265, 8);
  expect(cylinderArea(0.5, 2)).toBeCloseTo(3.14159265, 8);
});

it('goes round a rectangular duct at the outside of its board', () => {
  // 900 x 600 mm with 2 in of board: 3.4064 m round, as the invented demo cuts it for D04
  expect(rectangularDuctArea({ width: 0.9, height: 0.6, thickness: 0.0508, length: 1 })).toBeCloseTo(3.4064, 6);
});

it('closes a vessel with the ends that it has', () => {
  const vessel = { outsideDiameter: 1.0016, length: 1.9 };
  // the invented demo's E01, two domed ends: 9.13 m²
  expect(vesselArea({ ...vessel, ends: 'domed' })).toBeCloseTo(9.13, 2);
  expect(vesselArea({ ...vessel, ends: 'none' })).toBeCloseTo(cylinderArea(1.0016, 1.9), 12);
});

it('has more surface with flat ends than without, and more with domed ones', () => {
  const size = double({ min: 0.01, max: 20, noNaN: true });
  assert(
    property(size, size, (outsideDiameter, length) => {
      const areas = (['none', 'flat', 'domed'] as const).map((ends) => vesselArea({ outsideDiameter, length, ends }));
      expect(areas[0]).toBeLessThan(areas[1]!);
      expect(areas[1]).toBeLessThan(areas[2]!);
    }),
  );
});

it.each([0, -1, NaN, Infinity])('refuses a dimension of %p', (wrong) => {
  expect(() => cylinderArea(wrong, 1)).toThrow('Outside diameter must be positive');
  expect(() => rectangularDuctArea({ width: 1, height: 1, thickness: 0.05, length: wrong })).toThrow(
    'Length must be positive',
  );
  expect(() => vesselArea({ outsideDiameter: wrong, length: 1, ends: 'flat' })).toThrow('must be positive');
});
