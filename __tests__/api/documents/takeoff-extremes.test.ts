import type { Snapshot } from '@/api/contracts/revision';
import { renderTakeoff } from '@/api/documents/takeoff-pdf';

import { pagesOf, textOf } from '../../support/pdf';
import { sampleSnapshot } from '../../support/snapshot';

const frozen = (snapshot: Snapshot) => renderTakeoff(snapshot, { draft: false });
const at = '2026-03-12T15:40:00.000Z';

it('marks every page of a draft, and says when it was made', async () => {
  const draft = { ...sampleSnapshot(24), letter: null, frozenAt: null, validUntil: null };
  const pages = pagesOf(await renderTakeoff(draft, { draft: true, at }));
  expect(pages.length).toBeGreaterThan(3);
  for (const page of pages) {
    expect(page).toContain('TW-0231 DRAFT');
    expect(page).toMatch(/draft of 12 March 2026 at 15:40 GMT, not issued/);
    expect(page).not.toContain('Revision');
  }
});

it.each([1, 1500])(
  'prints a job of %i runs',
  async (count) => {
    const snapshot = sampleSnapshot(count);
    const pdf = await frozen(snapshot);
    const pages = pagesOf(pdf);
    expect(pages.at(-1)).toContain(`page ${pages.length} of ${pages.length}`);
    const heads = pages.filter((page) => page.includes('Service and size') && page.includes('length m'));
    // the list of runs on hold goes on over pages, with its heads on each
    if (count > 1000) expect(heads.length).toBeGreaterThan(3);
    const last = snapshot.runs.filter(({ status }) => status !== 'measured').at(-1);
    if (last) expect(textOf(pdf)).toContain(last.number);
  },
  60_000,
);

it('prints a job in which nothing is entered yet', async () => {
  const empty: Snapshot = {
    ...sampleSnapshot(0),
    to: [],
    drawings: [],
    addenda: [],
    places: [],
    services: [],
    standards: [],
    job: {
      ...sampleSnapshot(0).job,
      site: '',
      scope: '',
      bidDue: null,
      specification: { number: '', title: '', revision: '', date: null },
    },
  };
  const text = textOf(await frozen(empty));
  for (const words of [
    'Nothing is insulated yet.',
    'Nothing is measured yet.',
    'No drawings are named.',
    'No addenda were received.',
    'none was handed down',
  ])
    expect(text).toContain(words);
});

it('wraps very long names and keeps what its type cannot print out of the way, saying so', async () => {
  const snapshot = sampleSnapshot(3);
  const word = 'Donaudampfschifffahrtsgesellschaftskapitänswitwenrentenauszahlungsstelle'.repeat(2);
  const named: Snapshot = {
    ...snapshot,
    job: { ...snapshot.job, name: `بركة السباحة ${word}`, site: 'בריכה 🏊‍♀️ Saltern', scope: 'A\u202Eb‮c 配管' },
    letterhead: { ...snapshot.letterhead, name: `Tidewrack ${'and Sons '.repeat(12)}` },
    schedule: {
      rows: snapshot.schedule.rows.map((row) => ({
        ...row,
        service: word,
        sizes: Array.from({ length: 60 }, (_, index) => `DN ${index}`),
      })),
    },
  };
  const pdf = await frozen(named);
  const text = textOf(pdf);
  expect(text.replace(/\s/g, '')).toContain(word);
  // Hebrew, and an emoji of four code points, which a person sees as one sign
  expect(text).toContain('????? ? Saltern');
  expect(text).toContain('Signs of names that this type does not have stand as “?”');
});

it('splits a row that is taller than a page, and loses none of it', async () => {
  const snapshot = sampleSnapshot(1);
  const numbers = Array.from({ length: 1500 }, (_, index) => `RUN-${(index * 7919) % 100_000}-X`);
  const [row] = snapshot.schedule.rows;
  const text = textOf(await frozen({ ...snapshot, schedule: { rows: [{ ...row!, runNumbers: numbers }] } }));
  const missing = numbers.filter((number) => !text.includes(number));
  expect(missing).toEqual([]);
});

it('writes numbers and dates as the firm’s country does', async () => {
  const snapshot = sampleSnapshot(24);
  const german = { ...snapshot, letterhead: { ...snapshot.letterhead, locale: 'de-DE' } };
  const text = textOf(await frozen(german));
  expect(text).toContain('12. März 2026');
  expect(text).toContain('63,1 °C');
});
