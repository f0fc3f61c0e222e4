import fc from 'fast-check';

import {
  editText,
  inUnits,
  quantities,
  quantitySchema,
  readQuantity,
  show,
  showWithUnit,
  unitLabel,
  type QuantityKind,
} from '@/api/contracts/quantities';

const kinds = Object.keys(quantities).filter((kind): kind is QuantityKind => kind in quantities);
const read = (...given: Parameters<typeof readQuantity>) => {
  const reading = readQuantity(...given);
  if ('problem' in reading) throw new Error(reading.problem);
  return reading.quantity;
};

// Exact by definition: 1 in = 25.4 mm, 1 ft = 0.3048 m, 1 mile = 1609.344 m (NIST SP 811, appendix B.8).
it.each([
  ['dimension', '2"', 0.0508],
  ['length', '150 ft', 45.72],
  ['temperature', '140 °F', 60],
  ['difference', '1.8 °F', 1],
  ['speed', '10 mph', 4.4704],
  ['area', '100 ft2', 9.290304],
] as const)('reads %s %s', (kind, text, value) => {
  expect(read(kind, text, 'SI').value).toBeCloseTo(value, 9);
});

// NIST SP 811 (2008), appendix B.8: Btu (IT) factors as printed.
it.each([
  ['heatPerLength', 1, 0.9615],
  ['heatFlux', 1, 3.154591],
  ['coefficient', 1, 5.678263],
  ['conductivity', 1, 0.1442279],
  ['resistance', 1, 0.1761102],
] as const)('turns one inch-pound unit of %s into %p × %p', (kind, one, value) => {
  const digits = kind === 'heatPerLength' ? 3 : 6;
  expect(read(kind, `${one} ${unitLabel(kind, 'IP')}`, 'SI').value).toBeCloseTo(value, digits);
});

it('keeps what was typed with its unit, and shows it again in that unit only', () => {
  const quantity = read('length', '150 ft', 'SI');
  expect(quantity.typed).toEqual({ text: '150', unit: 'ft' });
  expect(editText('length', quantity, 'IP')).toBe('150');
  expect(editText('length', quantity, 'SI')).toBe('45.72');
});

it('does not drift: looking at a value in other units ten times changes nothing', () => {
  fc.assert(
    fc.property(fc.constantFrom(...kinds), fc.double({ min: -1e4, max: 1e4, noNaN: true }), (kind, number) => {
      const quantity = read(kind, String(number.toFixed(3)), 'SI');
      for (let turn = 0; turn < 10; turn += 1) editText(kind, quantity, turn % 2 ? 'SI' : 'IP');
      const again = read(kind, `${inUnits(kind, quantity.value, 'IP')}`.replace(/e.*/, ''), 'IP');
      if (Math.abs(quantity.value) > 1e-3) expect(again.value).toBeCloseTo(quantity.value, 6);
      expect(editText(kind, quantity, 'SI')).toBe(number.toFixed(3));
    }),
  );
});

it.each(['', 'abc', '1e9', '12 parsecs', '--3', '1.2.3', 'NaN', 'Infinity'])('refuses %p with words', (text) => {
  expect(readQuantity('length', text, 'SI')).toHaveProperty('problem');
});

it('shows a true minus and no minus on zero', () => {
  expect(show('temperature', -7, { units: 'SI' })).toBe('−7.0');
  expect(show('temperature', -0.04, { units: 'SI' })).toBe('0.0');
  expect(showWithUnit('humidity', 85, { units: 'SI' })).toBe('85%');
});

it('refuses a value that is not what was typed, and one outside its bounds, in both units', () => {
  const schema = quantitySchema('length', { above: 0, max: 1000 });
  expect(schema.safeParse({ value: 45.72, typed: { text: '150', unit: 'ft' } }).success).toBe(true);
  expect(schema.safeParse({ value: 50, typed: { text: '150', unit: 'ft' } }).success).toBe(false);
  expect(schema.safeParse({ value: NaN }).success).toBe(false);
  const tooLong = schema.safeParse({ value: 2000 });
  expect(tooLong.error?.issues[0]?.message).toBe('Must be at most 1000.0 m (3280.8 ft)');
  expect(schema.safeParse({ value: 0 }).error?.issues[0]?.message).toContain('more than 0.0');
});
