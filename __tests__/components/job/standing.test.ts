import type { Judgement } from '@/api/contracts/judgement';
import type { Message, Revision } from '@/api/contracts/revision';
import type { Run } from '@/api/contracts/run';
import { flaggedRuns, listText, revisionText, takenOffText } from '@/components/job/standing';

const run = (number: string, shape: Run['shape']): Run => ({
  id: number,
  version: 1,
  number,
  title: '',
  serviceId: 's',
  placeId: 'p',
  levelId: 'l',
  drawingId: null,
  shape,
  elevation: null,
  fittings: {},
  status: 'measured',
  hold: null,
  override: null,
  note: '',
});
const pipe = (metres: number): Run['shape'] => ({
  kind: 'pipe',
  size: { standard: 'asme-steel', nominal: 'NPS 2' },
  length: { value: metres },
  orientation: 'horizontal',
});
const duct: Run['shape'] = { kind: 'round-duct', diameter: { value: 0.25 }, length: { value: 44 } };
const piece: Run['shape'] = { kind: 'piece', count: 3 };

describe('what is taken off', () => {
  it('keeps pipes, ducts and equipment apart, since their metres are not the same', () => {
    const runs = [run('R1', pipe(1200)), run('R2', pipe(34.5)), run('D1', duct), run('E1', piece)];
    expect(takenOffText(runs, 'SI')).toBe('2 pipe runs (1,234.5 m), 1 duct run (44.0 m) and 1 piece of equipment');
  });

  it('reads in feet for who works in feet', () => {
    // 1 ft is 0.3048 m by definition
    expect(takenOffText([run('R1', pipe(30.48))], 'IP')).toBe('1 pipe run (100.0 ft)');
  });
});

const judged = (runId: string, kinds: Judgement['runs'][number]['flags'][number]['kind'][]) => ({
  runId,
  assembly: null,
  names: [],
  outsideDiameter: null,
  layerThicknesses: [],
  body: null,
  nature: 'hot' as const,
  surface: null,
  heatFlow: null,
  flux: null,
  governing: null,
  verdicts: [],
  flags: kinds.map((kind) => ({ runId, kind, verdict: null, meetsBy: null, words: [] })),
  problem: null,
});

it('counts a run once, however many limits it does not meet, and tells a hold from a limit', () => {
  const runs = [run('R1', pipe(1)), run('R2', pipe(1)), run('R3', pipe(1)), run('R4', pipe(1))];
  const judgement = {
    engineVersion: '1',
    runs: [
      judged('R1', ['touch', 'energy-code']),
      judged('R2', ['hold', 'energy-code']),
      judged('R3', ['not-specified']),
      judged('R4', []),
    ],
  };
  expect(flaggedRuns(runs, judgement)).toEqual({ notMet: ['R1', 'R2'], onHold: ['R2'], open: ['R3'] });
});

describe('the newest revision', () => {
  const message = (state: Message['state'], name: string): Message => ({
    id: name,
    version: 1,
    revisionId: 'r',
    contactId: 'c',
    to: { name, email: 'a@client.example' },
    subject: '',
    state,
    answer: '',
    attempts: 1,
    createdAt: '2026-11-26T15:40:00Z',
    sentAt: null,
    messageId: null,
    link: null,
  });
  const revision = (messages: Message[]): Revision => ({
    id: 'r',
    jobId: 'j',
    letter: 'B',
    frozenAt: '2026-07-01T15:40:00Z',
    frozenBy: 'Ada Quill',
    validUntil: '2026-08-15',
    rendering: 'ready',
    pdfHash: null,
    pdfBytes: null,
    supersededBy: null,
    runs: 1,
    flags: 0,
    messages,
  });

  it("says when it was frozen on the firm's clock, and to whom it went", () => {
    expect(revisionText(revision([message('sent', 'Marisel Quonder')]), 'Europe/Dublin')).toBe(
      'Revision B was frozen on 1 July, 16:40 by Ada Quill; sent to Marisel Quonder.',
    );
  });

  it('counts several, and nobody whom it has not reached', () => {
    const several = [message('sent', 'A'), message('sent', 'B'), message('refused', 'C')];
    expect(revisionText(revision(several), 'UTC')).toContain('sent to 2 people');
    expect(revisionText(revision([message('waiting', 'A')]), 'UTC')).toContain('not sent yet');
  });
});

it('lists as one speaks', () => {
  expect(listText([])).toBe('');
  expect(listText(['A'])).toBe('A');
  expect(listText(['A', 'B', 'C'])).toBe('A, B and C');
});
