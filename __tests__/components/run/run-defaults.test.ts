import { aRun } from '../../support/run-rows';
import { asShape, newRun, nextNumber } from '@/components/run/run-defaults';

it.each([
  [['R01', 'R42', 'D06', 'E04'], 'R43'],
  [['D01', 'D02', 'R99'], 'D03'],
  [[], 'R01'],
  [['riser'], 'R01'],
  [['P009'], 'P010'],
])('counts on from %p to %p', (numbers, next) => {
  expect(nextNumber(numbers)).toBe(next);
});

it('begins a new run with where the last one was, but with no length and no fittings', () => {
  const last = aRun({ drawingId: 'M-401', fittings: { tee: 4 }, note: 'as drawn' });
  expect(newRun(last, 'R43')).toMatchObject({
    number: 'R43',
    serviceId: 'steam',
    placeId: 'tunnel',
    drawingId: 'M-401',
    fittings: {},
    note: '',
    shape: { kind: 'pipe', size: { nominal: 'NPS 4' }, length: undefined },
  });
});

it('keeps a length when the shape changes, and forgets what the new shape does not have', () => {
  const duct = asShape('rectangular-duct', aRun().shape);
  expect(duct).toMatchObject({ kind: 'rectangular-duct', length: { value: 86 } });
  expect(duct).not.toHaveProperty('size');
  expect(asShape('piece', aRun().shape)).toEqual({ kind: 'piece', count: 1 });
});
