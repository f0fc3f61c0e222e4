import { madeDiameter, nestedDiameter } from '@/api/engine/standards/made-diameters';

const inch = 0.0254;
const steel = (outsideDiameter: number) => ({ standard: 'asme-steel', outsideDiameter }) as const;
const copper = (outsideDiameter: number) => ({ standard: 'astm-copper', outsideDiameter }) as const;

// ASTM C585 as in ASHRAE Handbook Fundamentals 2021 (SI) ch. 23 Tables 13 and 14, inch columns × 25.4
it.each([
  [steel(0.1143), 'in:2', 8.62],
  [steel(0.0483), 'in:2', 6.62],
  [steel(0.0213), 'in:2.5', 6.62],
  [steel(0.1683), 'in:4.5', 16],
  [copper(0.05397), 'in:1.5', 5],
  [copper(0.01588), 'in:1', 2.88],
] as const)('%j takes %s to the made diameter', (bore, name, inches) => {
  expect(madeDiameter(bore, name, 'rigid')).toMatchObject({ outsideDiameter: inches * inch, basis: 'made' });
});

// ASHRAE Handbook Fundamentals 2021 (SI) ch. 23 Tables 15 and 16, in mm
it.each([
  [steel(0.0267), 'in:0.75', 0.0668],
  [copper(0.02222), 'in:1', 0.0762],
] as const)('foam on %j, %s', (bore, name, outsideDiameter) => {
  expect(madeDiameter(bore, name, 'flexible')).toMatchObject({ outsideDiameter, basis: 'made' });
});

it('adds the nominal where no table knows the pipe or the name, and says so', () => {
  const nominal = (outsideDiameter: number) => ({
    outsideDiameter: expect.closeTo(outsideDiameter, 9),
    basis: 'nominal',
  });
  expect(madeDiameter({ standard: 'en-1057', outsideDiameter: 0.054 }, 'in:1', 'rigid')).toMatchObject(nominal(0.1048));
  expect(madeDiameter({ standard: 'en-10255', outsideDiameter: 0.0761 }, 'in:1', 'rigid')).toMatchObject(
    nominal(0.1269),
  );
  expect(madeDiameter(steel(0.0603), 'mm:50', 'rigid')).toMatchObject(nominal(0.1603));
  expect(madeDiameter(copper(0.02857), 'in:1.5', 'flexible')).toMatchObject(nominal(0.10477));
  expect(madeDiameter({ standard: null, outsideDiameter: 0.06 }, 'in:1', 'rigid')).toMatchObject(nominal(0.1108));
});

it('takes EN steel of the same outside diameter by the same section', () => {
  expect(madeDiameter({ standard: 'en-10255', outsideDiameter: 0.0603 }, 'in:2', 'rigid')?.basis).toBe('made');
});

it('does not make what a table leaves out', () => {
  expect(madeDiameter(steel(0.2191), 'in:1', 'rigid')).toBeUndefined();
  expect(madeDiameter(copper(0.01588), 'in:5', 'rigid')).toBeUndefined();
});

// the example that ASTM C585-90(2004) sec. 4.3 gives: NPS 4 with 2 in measures 8.62 in, the outer layer is ordered for NPS 8
it('nests an outer section on an inner one', () => {
  const inner = madeDiameter(steel(0.1143), 'in:2', 'rigid')?.outsideDiameter ?? NaN;
  expect(nestedDiameter(inner, 'in:2', 'rigid')).toMatchObject({ outsideDiameter: 12.75 * inch, basis: 'made' });
});

it('nests nothing on a diameter that no pipe has', () => {
  expect(nestedDiameter(0.2, 'in:2', 'rigid')).toMatchObject({
    outsideDiameter: expect.closeTo(0.3016, 9),
    basis: 'nominal',
  });
  expect(nestedDiameter(8.62 * inch, 'in:1', 'flexible')?.basis).toBe('nominal');
  expect(nestedDiameter(7.62 * inch, 'in:1', 'rigid')).toBeUndefined();
});
