import fc from 'fast-check';

import { takeoffFileName } from '@/api/documents/file-name';
import { cautionsFor } from '@/api/documents/takeoff/cautions';
import { clarificationsOf, numbersFor } from '@/api/documents/takeoff/clarifications';
import { numberRanges } from '@/api/documents/takeoff/number-ranges';
import { printedQuantities } from '@/api/documents/takeoff/printed-quantities';
import { dateIn, daysAfter } from '@/api/services/calendar';
import { revisionLetter } from '@/api/contracts/revision-letter';

import { sampleSnapshot } from '../../support/snapshot';

it('letters revisions as drawings are lettered', () => {
  expect([1, 2, 26, 27, 52, 53, 702, 703].map(revisionLetter)).toEqual(['A', 'B', 'Z', 'AA', 'AZ', 'BA', 'ZZ', 'AAA']);
  const first = Array.from({ length: 2000 }, (_, index) => revisionLetter(index + 1));
  expect(new Set(first).size).toBe(2000);
});

it('lists runs that follow each other as a range', () => {
  expect(numberRanges(['R01', 'R02', 'R03', 'R07'])).toBe('R01 to R03, R07');
  expect(numberRanges(['R1', 'R2'])).toBe('R1, R2');
  expect(numberRanges(['R9', 'R10', 'R11'])).toBe('R9 to R11');
  expect(numberRanges(['R09', 'D10', 'R11'])).toBe('R09, D10, R11');
  expect(numberRanges(['R099', 'R100', 'R101', 'M'])).toBe('R099 to R101, M');
  expect(numberRanges([])).toBe('');
});

it('adds printed lines, whatever the lengths are', () => {
  const length = fc.double({ min: 0.001, max: 5000, noNaN: true });
  fc.assert(
    fc.property(fc.array(length, { minLength: 1, maxLength: 40 }), (lengths) => {
      const [line] = sampleSnapshot(1).takeoff.lines;
      const lines = lengths.map((each, index) => ({ ...line!, key: String(index), length: each }));
      const [kind] = printedQuantities({ lines, fittings: [], byOthers: [], onHold: [] });
      const printed = lengths.map((each) => each.toFixed(1));
      const cents = printed.reduce((sum, words) => sum + BigInt(words.replace('.', '')), 0n);
      expect(kind!.sums.length!.toFixed(1).replace('.', '')).toBe(cents === 0n ? '00' : String(cents).padStart(2, '0'));
    }),
  );
});

it('numbers flags by limit and service, and finds them again from the schedule', () => {
  const snapshot = sampleSnapshot(24);
  const clarifications = clarificationsOf(snapshot);
  expect(clarifications.map(({ number }) => number)).toEqual(clarifications.map((_, index) => index + 1));
  const flagged = new Set(snapshot.flags.map(({ runId }) => runId));
  const row = snapshot.schedule.rows.find(({ flags }) => flags > 0)!;
  expect(numbersFor(clarifications, row.runIds).length).toBeGreaterThan(0);
  expect(
    numbersFor(
      clarifications,
      snapshot.runs.filter(({ id }) => !flagged.has(id)).map(({ id }) => id),
    ),
  ).toEqual([]);
});

it('warns of what the job has, and not of what it has not', () => {
  const { services, places, runs } = sampleSnapshot(24);
  const all = cautionsFor({ services, places, runs, materialNames: ['Mineral fibre pipe section'] }).join(' ');
  for (const word of ['Legionella', 'asbestos', 'Fibre dust', 'freezing', '25/50', 'Hot surfaces'])
    expect(all).toContain(word);
  const mild = {
    services: services.filter(({ fluid }) => fluid === 'air'),
    places: places.slice(0, 1),
    runs: [],
    materialNames: ['Flexible elastomeric foam'],
  };
  const few = cautionsFor(mild).join(' ');
  for (const word of ['Legionella', 'Fibre dust', 'freezing', '25/50', 'Hot surfaces']) expect(few).not.toContain(word);
  expect(few).toContain('asbestos');
});

it('names files so that every disk and mail program takes them', () => {
  expect(takeoffFileName({ number: 'BLI-0417', letter: 'A', date: '2026-12-01' })).toBe(
    'BLI-0417-Rev-A-takeoff-2026-12-01.pdf',
  );
  expect(takeoffFileName({ number: '../Ж"\r\n;é', letter: null, date: '2026-12-01' })).toBe(
    'e-DRAFT-takeoff-2026-12-01.pdf',
  );
  fc.assert(
    fc.property(fc.string({ unit: 'binary' }), (number) => {
      expect(takeoffFileName({ number, letter: 'B', date: '2026-12-01' })).toMatch(/^[A-Za-z0-9-]{1,80}\.pdf$/);
    }),
  );
});

it('counts calendar days in the job’s own zone', () => {
  expect(dateIn(new Date('2026-03-12T23:30:00Z'), 'Europe/Dublin')).toBe('2026-03-12');
  expect(dateIn(new Date('2026-06-12T23:30:00Z'), 'Europe/Dublin')).toBe('2026-06-13');
  expect(dateIn(new Date('2026-03-12T01:00:00Z'), 'America/New_York')).toBe('2026-03-11');
  expect(daysAfter('2026-03-12', 45)).toBe('2026-04-26');
  expect(daysAfter('2027-12-31', 60)).toBe('2028-02-29');
});
