import { aRow, aRun, judged } from '../../support/run-rows';
import { narrow } from '@/components/run/run-filters';
import { rowSize, runOrder } from '@/components/run/run-row';
import { runVerdict } from '@/components/run/run-verdict';
import { totalText } from '@/components/run/runs-total';

const held = { runId: 'R42', kind: 'hold', verdict: null, meetsBy: null, words: ['on hold'] } as const;
const short = { ...held, kind: 'energy-code' } as const;
const rows = [
  aRow(aRun({ number: 'R29' }), judged()),
  aRow(aRun({ number: 'R30', placeId: 'roof' }), judged([{ ...short, words: [] }])),
  aRow(aRun({ number: 'R42', fittings: { tee: 2, hanger: 13 } }), judged([{ ...held, words: [] }])),
];
const numbers = (list: typeof rows) => list.map(({ run }) => run.number);

it('narrows to a place, to what is flagged, to what is on hold, and to all of these at once', () => {
  expect(numbers(narrow(rows, { place: 'roof' }))).toEqual(['R30']);
  expect(numbers(narrow(rows, { flags: 'flagged' }))).toEqual(['R30']);
  expect(numbers(narrow(rows, { flags: 'hold' }))).toEqual(['R42']);
  expect(numbers(narrow(rows, { flags: 'clear' }))).toEqual(['R29']);
  expect(numbers(narrow(rows, { place: 'roof', flags: 'hold' }))).toEqual([]);
  expect(numbers(narrow(rows, {}))).toEqual(['R29', 'R30', 'R42']);
});

it('says what fails, that a hold is to be minded, and that the rest meets all', () => {
  expect(rows.map(({ judged: result }) => runVerdict(result))).toEqual([
    { verdict: 'pass', words: 'meets all' },
    { verdict: 'fail', words: 'energy code' },
    { verdict: 'caution', words: 'on hold' },
  ]);
  expect(runVerdict(undefined)).toEqual({ verdict: 'none', words: 'judging' });
});

it('adds up lengths and fittings, leaving hangers out, in the units of the reader', () => {
  expect(totalText(rows, 'SI')).toBe('3 runs · 258.0 m · 2 fittings · 2 flagged');
  expect(totalText(rows.slice(0, 1), 'IP')).toBe('1 run · 282.2 ft');
});

it('orders run numbers as people count', () => {
  expect(['R10', 'D2', 'R2'].toSorted(runOrder)).toEqual(['D2', 'R2', 'R10']);
});

it('says steel by its DN in SI and by inches otherwise', () => {
  const pipeSize = {
    standard: 'asme-steel',
    standardTitle: 'Steel pipe',
    nominal: 'NPS 4',
    dn: 100,
    nominalInches: 4,
    outsideDiameter: 0.1143,
    walls: [],
    source: 'ASME B36.10M',
    confidence: 'high',
  } as const;
  const row = { ...aRow(aRun()), pipeSize: { ...pipeSize, walls: [] } };
  expect(rowSize(row, 'SI')).toBe('DN 100');
  expect(rowSize(row, 'IP')).toBe('4 in');
});
