import { wordsText } from '@/api/contracts/words-text';
import { renderTakeoff } from '@/api/documents/takeoff-pdf';
import { takeSnapshot } from '@/api/services/snapshot';
import { snapshotSchema, type Snapshot } from '@/api/contracts/revision';
import { demoInMemory } from '@/db/seeds/demo/in-memory';
import { demoEstimator, demoFirm } from '@/db/seeds/demo/people';

import { pagesOf, textOf } from '../../support/pdf';

const issue = { letter: 'B', frozenAt: new Date('2026-03-12T15:40:00Z'), validUntil: '2026-04-26' };
let snapshot: Snapshot;
let pages: string[];
let text: string;
beforeAll(async () => {
  const data = await demoInMemory('addendum-1');
  snapshot = takeSnapshot({ data, firm: { ...demoFirm, id: data.job.id }, member: demoEstimator, issue });
  const pdf = await renderTakeoff(snapshot, { draft: false });
  [pages, text] = [pagesOf(pdf), textOf(pdf)];
});

it('freezes the demo in the shape of the contract, which storing as JSON does not change', () => {
  const stored = snapshotSchema.parse(JSON.parse(JSON.stringify(snapshot)));
  expect(stored).toEqual(JSON.parse(JSON.stringify(snapshot)));
  expect(snapshot.runs).toHaveLength(52);
});

it('prints the sentence of every flag', () => {
  expect(snapshot.flags.length).toBeGreaterThan(15);
  for (const { words } of snapshot.flags) expect(text).toContain(wordsText(words, 'SI').trim());
});

it('prints totals that are the sums of its lines', () => {
  const total = (kind: string, of: 'length' | 'area', digits: number) => {
    const lines = snapshot.takeoff.lines.filter(({ appliesTo }) => appliesTo === kind);
    const steps = lines.map((line) => Math.round(Number((line[of] ?? 0).toFixed(digits)) * 10 ** digits));
    return (steps.reduce((sum, step) => sum + step, 0) / 10 ** digits)
      .toFixed(digits)
      .replace(/\B(?=(\d{3})+\.)/g, ',');
  };
  const line = (words: string) =>
    pages
      .join('\n')
      .split('\n')
      .find((printed) => printed.includes(words));
  expect(line('Pipes and tubes, total')).toContain(total('pipe', 'length', 1));
  expect(line('Ducts, total')).toContain(total('duct', 'area', 2));
  expect(line('Equipment, total')).toContain(total('equipment', 'area', 2));
});

it('names the sources of every number, and of each how sure it is', () => {
  const kinds = new Set(snapshot.standards.map(({ kind }) => kind));
  expect([...kinds].sort()).toEqual(['code', 'finish', 'made-thickness', 'material', 'pipe', 'safety']);
  for (const { source, confidence } of snapshot.standards) {
    expect(source).not.toBe('');
    expect(confidence).not.toBe('');
  }
});

it('shows the cautions that a hospital with steam, hot water, a plenum and a cold roof needs', () => {
  for (const word of [
    'asbestos',
    'Legionella',
    'Fibre dust',
    'delays freezing',
    '25/50',
    'lock out',
    'authority having jurisdiction',
  ])
    expect(text).toContain(word);
});
