import { isSame, mergeEdits } from '@/components/forms/merge-edits';

const base = {
  name: 'Roof',
  note: '',
  air: { hottest: { air: { value: 36 }, source: 'Note 4' }, coldest: { air: { value: -12 }, source: 'Note 4' } },
  placeIds: ['a'],
};

it('takes over what only they changed, and keeps what only I changed', () => {
  const mine = { ...base, note: 'Sun is not counted' };
  const theirs = { ...base, name: 'Roof, outdoors' };
  expect(mergeEdits(base, mine, theirs)).toEqual({ ...base, name: 'Roof, outdoors', note: 'Sun is not counted' });
});

it('does so inside of parts as well', () => {
  const mine = { ...base, air: { ...base.air, coldest: { ...base.air.coldest, source: 'Measured' } } };
  const theirs = { ...base, air: { ...base.air, hottest: { ...base.air.hottest, air: { value: 38 } } } };
  expect(mergeEdits(base, mine, theirs).air).toEqual({ hottest: theirs.air.hottest, coldest: mine.air.coldest });
});

it('keeps mine where both changed the same', () => {
  expect(mergeEdits(base, { ...base, name: 'A' }, { ...base, name: 'B' }).name).toBe('A');
  expect(mergeEdits(base, { ...base, placeIds: ['a', 'b'] }, { ...base, placeIds: [] }).placeIds).toEqual(['a', 'b']);
});

it('never mixes the value of one with the words of another', () => {
  type Place = { air: { value: number; typed?: { text: string; unit: string } } };
  const before: Place = { air: { value: 9 } };
  const mine: Place = { air: { value: 9, typed: { text: '9', unit: '°C' } } };
  const theirs: Place = { air: { value: 10, typed: { text: '50', unit: '°F' } } };
  expect(mergeEdits(before, mine, theirs)).toEqual(mine);
  expect(mergeEdits(before, before, theirs)).toEqual(theirs);
});

it('compares what is said, not how it is written', () => {
  expect(isSame({ a: 1, b: undefined }, { a: 1 })).toBe(true);
  expect(isSame({ a: 1, b: 2 }, { b: 2, a: 1 })).toBe(true);
  expect(isSame([1, 2], [2, 1])).toBe(false);
  expect(isSame(null, {})).toBe(false);
});
