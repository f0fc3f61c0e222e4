import type { Snapshot } from '@/api/contracts/revision';
import { renderTakeoff } from '@/api/documents/takeoff-pdf';

import { destinationsOf, factsOf, pagesOf, pixelsOf, structureOf, textOf } from '../../support/pdf';
import { sampleSnapshot } from '../../support/snapshot';

const frozen = (snapshot: Snapshot) => renderTakeoff(snapshot, { draft: false });

const snapshot = sampleSnapshot(24);
let pdf: Buffer;
let pages: string[];
let text: string;
beforeAll(async () => {
  pdf = await frozen(snapshot);
  pages = pagesOf(pdf);
  text = textOf(pdf);
});

it('says on every page whose it is, which revision, and which page of how many', () => {
  expect(pages.length).toBeGreaterThan(3);
  pages.forEach((page, index) => {
    expect(page).toContain('Tidewrack Insulation');
    expect(page).toContain('TW-0231 Revision B');
    expect(page).toContain('12 March 2026 · valid to 26 April 2026');
    expect(page).toContain(`page ${index + 1} of ${pages.length}`);
    expect(page).not.toContain('DRAFT');
  });
});

it('tells an outsider on the first page what, for whom, and on what it stands', () => {
  expect(pages[0]).toContain('Saltern Quay swimming pool, plant renewal');
  expect(pages[0]).toContain('Harbour Road, Saltern Quay');
  expect(pages[0]).toContain('Wim Oosterdale');
  expect(pages[0]).toContain('Nerys Thornquill');
  expect(pages[0]).toContain('23 07 00, Insulation of pipes, ducts and equipment, issue for bid, 9 January 2026');
  for (const { number, title } of snapshot.drawings) {
    expect(text).toContain(number);
    expect(text).toContain(title);
  }
  expect(text).toContain('revision P3, 18 February 2026, 1:50');
  expect(text).toContain('Roof pipes finished in white-painted aluminium, not bright.');
});

it('prints every row of the schedule with its thickness', () => {
  for (const { sizes, places, finish } of snapshot.schedule.rows) {
    expect(text).toContain(sizes[0]);
    expect(text).toContain(places[0]);
    expect(text).toContain(finish);
  }
  expect(text).toContain('51 + 38');
});

it('prints the snapshot’s quantities, each total the sum of its printed lines', () => {
  const pipes = snapshot.takeoff.lines.filter(({ appliesTo }) => appliesTo === 'pipe');
  const printed = pipes.map(({ length }) => Number((length ?? 0).toFixed(1)));
  for (const length of printed) expect(text).toContain(length.toFixed(1));
  const total = printed.reduce((sum, length) => sum + Math.round(length * 10), 0) / 10;
  const line = pages
    .join('\n')
    .split('\n')
    .find((words) => words.includes('Pipes and tubes, total'));
  expect(line).toContain(total.toFixed(1));
});

it('prints each flag’s sentence as a numbered clarification that the schedule points to', () => {
  expect(text).toContain('25 mm is not enough: the surface would reach 63.1 °C; the limit is 60.0 °C.');
  expect(text).toContain('Dry, but by less than the margin of 1.00 K; it sweats from 87% on.');
  expect(text).toContain('On hold: Old lagging not yet tested for asbestos: do not disturb it.');
  expect(text).toContain('1. Heating flow: touch');
  expect(destinationsOf(pdf)).toContain('clarification-1');
});

it('prints cautions, standards with their confidence, reasons and who holds', () => {
  for (const caution of snapshot.cautions) expect(text).toContain(caution);
  for (const { name, source, confidence } of snapshot.standards) {
    expect(text).toContain(name);
    expect(text).toContain(source);
    expect(text).toContain(`Confidence: ${confidence}`);
  }
  expect(text).toContain('Legend of drawing M-12 shows 25 mm');
  expect(text).toContain('Placed by Idris Calloway.');
});

it('is tagged, titled, and dated by its freezing', () => {
  const facts = factsOf(pdf);
  expect(facts).toMatch(/Tagged:\s+yes/);
  expect(facts).toMatch(/Title:\s+TW-0231 Revision B, Saltern Quay swimming pool, plant renewal/);
  expect(facts).toMatch(/Page size:\s+595\.28 x 841\.89 pts \(A4\)/);
  const structure = structureOf(pdf);
  for (const tag of ['H1', 'H2', 'Table', 'TH', 'TD', 'Figure', 'Link']) expect(structure).toContain(tag);
  expect(facts).toContain('2026-03-12T15:40:00Z');
});

it('has no blank page, and none that is black', () => {
  for (const pixels of pixelsOf(pdf)) {
    const dark = pixels.filter((pixel) => pixel < 160).length / pixels.length;
    expect(dark).toBeGreaterThan(0.001);
    expect(dark).toBeLessThan(0.5);
  }
});

it('gives the same bytes again, also from a snapshot that was stored in between', async () => {
  const stored: Snapshot = JSON.parse(JSON.stringify(snapshot));
  expect((await frozen(stored)).equals(pdf)).toBe(true);
});
