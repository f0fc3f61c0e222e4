import { dayFrom, momentOf } from '@/db/seeds/demo/days';

const zone = 'Europe/Dublin';

it('counts calendar days in the zone, also over a clock change', () => {
  // 28 March 2027, 01:00 UTC: clocks in Ireland go forward
  const beforeMidnight = new Date('2027-03-27T23:30:00Z');
  expect(dayFrom(beforeMidnight, { zone, days: 0 })).toBe('2027-03-27');
  expect(dayFrom(beforeMidnight, { zone, days: 2 })).toBe('2027-03-29');
  const summerMidnight = new Date('2027-06-30T23:30:00Z');
  expect(dayFrom(summerMidnight, { zone, days: 0 })).toBe('2027-07-01');
  expect(dayFrom(summerMidnight, { zone, days: -5 })).toBe('2027-06-26');
});

it('finds the moment at which a clock there shows a time, in winter and in summer', () => {
  expect(momentOf('2027-01-15', '15:40', zone).toISOString()).toBe('2027-01-15T15:40:00.000Z');
  expect(momentOf('2027-07-15', '15:40', zone).toISOString()).toBe('2027-07-15T14:40:00.000Z');
  expect(momentOf('2027-03-28', '15:40', zone).toISOString()).toBe('2027-03-28T14:40:00.000Z');
  expect(momentOf('2027-07-15', '14:00', 'America/New_York').toISOString()).toBe('2027-07-15T18:00:00.000Z');
});
