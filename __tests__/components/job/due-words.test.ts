import { countdown, dueShort, dueText, instantOf, zoneText } from '@/components/job/due-words';

const winter = { date: '2026-12-03', time: '14:00', zone: 'Europe/Dublin' };

describe('the moment a bid is due', () => {
  // UTC offsets of the tz database: Dublin +0 in winter, +1 in summer; New York -5 in winter; Kathmandu +5:45 all year.
  it.each([
    [winter, '2026-12-03T14:00:00.000Z'],
    [{ ...winter, date: '2026-07-03' }, '2026-07-03T13:00:00.000Z'],
    [{ ...winter, zone: 'America/New_York' }, '2026-12-03T19:00:00.000Z'],
    [{ ...winter, zone: 'Asia/Kathmandu' }, '2026-12-03T08:15:00.000Z'],
    // clocks went forward that night at 01:00
    [{ ...winter, date: '2026-03-29', time: '02:30' }, '2026-03-29T01:30:00.000Z'],
  ])('%j is %s', (moment, instant) => {
    expect(instantOf(moment).toISOString()).toBe(instant);
  });

  it("reads in the job's own zone, wherever the reader is", () => {
    const now = new Date('2026-12-01T09:00:00Z');
    expect(dueText(winter, now)).toBe('Thursday 3 December, 14:00 in Dublin');
    expect(dueText({ ...winter, date: '2027-01-05' }, now)).toBe('Tuesday 5 January 2027, 14:00 in Dublin');
    expect(dueShort(winter)).toBe('Thu 3 Dec, 14:00');
    expect(zoneText('America/Argentina/Buenos_Aires')).toBe('Buenos Aires');
  });
});

describe('what is left', () => {
  const due = instantOf(winter);
  it.each([
    ['2026-12-01T17:00:00Z', 'in 1 day 21 hours', 'ahead'],
    ['2026-12-01T13:30:00Z', 'in 2 days', 'ahead'],
    ['2026-12-03T10:40:00Z', 'in 3 hours 20 minutes', 'today'],
    ['2026-12-03T13:59:30Z', 'in less than a minute', 'today'],
    ['2026-12-03T14:00:00Z', 'less than a minute ago', 'past'],
    ['2026-12-03T15:01:00Z', '1 hour 1 minute ago', 'past'],
    ['2026-11-01T14:00:00Z', 'in 32 days', 'ahead'],
  ])('at %s: %s', (now, text, standing) => {
    expect(countdown(due, new Date(now))).toEqual({ text, standing });
  });
});
