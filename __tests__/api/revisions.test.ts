import { revisionSchema, snapshotSchema } from '@/api/contracts/revision';
import { jobSummarySchema } from '@/api/contracts/job';
import { renderTakeoff } from '@/api/documents/takeoff-pdf';
import { sha256 } from '@/api/services/hashes';
import { createRevisionService } from '@/api/services/revision-service';
import { createWithFirm } from '@/db/with-firm';

import { runInput } from '../support/job-inputs';
import { pagesOf } from '../support/pdf';
import { freeze, newDesk, queued, render, send } from '../support/sending';
import { startStack, type Stack } from '../support/stack';

jest.setTimeout(60_000);
const now = new Date('2026-03-12T23:30:00Z');
let stack: Stack;
beforeAll(async () => {
  stack = await startStack({ clock: () => now });
});
afterAll(() => stack.stop());

it('freezes A, B, C: dated, valid as long as the firm says, each replaced by the last', async () => {
  const { agent, estimator, path } = await newDesk(stack);
  for (const letter of ['A', 'B', 'C']) {
    const revision = await freeze({ agent, path });
    expect(revision).toMatchObject({
      letter,
      frozenAt: now.toISOString(),
      frozenBy: estimator.name,
      rendering: 'waiting',
      runs: 1,
    });
    // 45 days after 12 March, the day it still was in Dublin
    expect(revision.validUntil).toBe('2026-04-26');
    expect(await queued(stack, 'revisionId', revision.id)).toBe(1);
  }
  const list = revisionSchema.array().parse((await agent.get(`${path}/revisions`).expect(200)).body);
  expect(list.map(({ letter, supersededBy }) => [letter, supersededBy])).toEqual([
    ['C', null],
    ['B', 'C'],
    ['A', 'C'],
  ]);
  const [summary] = jobSummarySchema.array().parse((await agent.get('/api/jobs').expect(200)).body);
  expect(summary?.lastRevision).toBe('C');
});

it('gives two people who freeze at once two letters', async () => {
  const { agent, path } = await newDesk(stack);
  const frozen = await Promise.all(Array.from({ length: 6 }, () => freeze({ agent, path })));
  expect(frozen.map(({ letter }) => letter).sort()).toEqual(['A', 'B', 'C', 'D', 'E', 'F']);
});

it('renders from the snapshot alone, once: later edits, another rendering and the database itself leave the bytes', async () => {
  const { agent, estimator, path, job, where } = await newDesk(stack);
  const revision = await freeze({ agent, path });
  const { body: current } = await agent.get(path).expect(200);
  await agent
    .patch(path)
    .send({ ...current, name: 'Renamed afterwards' })
    .expect(200);
  const run = { ...runInput(where), number: 'LATER-1', id: crypto.randomUUID(), version: null };
  await agent
    .patch(`${path}/runs`)
    .send({ put: [run], drop: [] })
    .expect(200);
  await render(stack, estimator, revision);

  const url = `/api/revisions/${revision.id}/pdf`;
  const first = await agent.get(url).buffer().expect(200);
  const text = pagesOf(first.body).join('\n');
  expect(text).toContain(job.name);
  expect(text).not.toContain('Renamed afterwards');
  expect(text).not.toContain('LATER-1');

  await render(stack, estimator, revision);
  const row = await stack.owner('revisions').where({ id: revision.id }).first();
  expect(row.pdf.equals(first.body)).toBe(true);
  expect((await renderTakeoff(snapshotSchema.parse(row.snapshot), { draft: false })).equals(first.body)).toBe(true);
  for (const change of [
    { pdf: Buffer.from('x'), pdf_hash: 'x', pdf_bytes: 1 },
    { snapshot: '{}' },
    { letter: 'Z' },
    { frozen_at: now },
  ])
    await expect(stack.owner('revisions').where({ id: revision.id }).update(change)).rejects.toThrow('does not change');

  expect(first.headers).toMatchObject({
    'content-type': 'application/pdf',
    'content-disposition': 'attachment; filename="TST-001-Rev-A-takeoff-2026-03-12.pdf"',
    etag: `"${sha256(first.body)}"`,
    'cache-control': 'private, no-cache',
  });
  await agent
    .get(url)
    .set('If-None-Match', `"${sha256(first.body)}"`)
    .expect(304);
  const { body: ready } = await agent.get(`/api/revisions/${revision.id}`).expect(200);
  expect(ready).toMatchObject({ rendering: 'ready', pdfHash: sha256(first.body), pdfBytes: first.body.length });
});

it('stores every input, result, standard and text in the snapshot', async () => {
  const { agent, path, estimator } = await newDesk(stack);
  const revision = await freeze({ agent, path });
  const row = await stack.owner('revisions').where({ id: revision.id }).first();
  const snapshot = snapshotSchema.parse(row.snapshot);
  const { body: judgement } = await agent.get(`${path}/judgement`).expect(200);
  expect(snapshot.judged).toEqual(judgement.runs);
  expect(snapshot.schedule).toEqual((await agent.get(`${path}/schedule`).expect(200)).body);
  expect(snapshot.takeoff).toEqual((await agent.get(`${path}/takeoff`).expect(200)).body);
  expect(snapshot.engineVersion).toBe(judgement.engineVersion);
  expect(snapshot.standards.length).toBeGreaterThan(0);
  expect(snapshot.cautions.length).toBeGreaterThan(2);
  expect(snapshot.preparedBy).toEqual({ name: estimator.name, email: estimator.email });
  expect(snapshot.letterhead.name).toBe('Test firm');
});

it('gives a draft at any time, marked on every page, and stores nothing', async () => {
  const { agent, path } = await newDesk(stack);
  const draft = await agent.get(`${path}/draft.pdf`).buffer().expect(200);
  expect(draft.headers['content-disposition']).toBe('inline; filename="TST-001-DRAFT-takeoff-2026-03-12.pdf"');
  for (const page of pagesOf(draft.body)) expect(page).toContain('TST-001 DRAFT');
  expect((await agent.get(`${path}/revisions`).expect(200)).body).toEqual([]);
});

it('keeps revision and rendering together: a rollback drops both', async () => {
  const { agent, estimator, path, job } = await newDesk(stack);
  const withFirm = createWithFirm({ db: stack.db, boss: stack.boss });
  let lost = '';
  const failing = withFirm(estimator.firmId, async (behind) => {
    const service = createRevisionService({ withFirm: (_firm, work) => work(behind), clock: () => now });
    lost = (await service.freeze(estimator, job.id)).id;
    throw new Error('no');
  });
  await expect(failing).rejects.toThrow('no');
  expect(await queued(stack, 'revisionId', lost)).toBe(0);
  expect((await agent.get(`${path}/revisions`).expect(200)).body).toEqual([]);
  expect((await freeze({ agent, path })).letter).toBe('A');
});

it('sends only the revision that stands, while it is valid', async () => {
  const { agent, path, contactIds } = await newDesk(stack);
  const [first] = [await freeze({ agent, path }), await freeze({ agent, path })];
  const refused = await agent
    .post(`/api/revisions/${first.id}/messages`)
    .send({ subject: 'x', words: '', contactIds })
    .expect(409);
  expect(refused.body.detail).toBe('Revision B has replaced Revision A: send that one');
  const late = await startStack({ clock: () => new Date('2026-04-27T00:30:00Z') });
  const { agent: other, estimator, path: otherPath, contactIds: theirs } = await newDesk(stack);
  const revision = await freeze({ agent: other, path: otherPath });
  const sending = late.services.revision.send(estimator, revision.id, { subject: 'x', words: '', contactIds: theirs });
  await expect(sending).rejects.toThrow('was valid to 2026-04-26');
  await late.stop();
});

it('keeps a contact to whom something was sent', async () => {
  const { agent, path, contactIds } = await newDesk(stack);
  await send(agent, await freeze({ agent, path }), contactIds);
  const { body: current } = await agent.get(path).expect(200);
  await agent
    .patch(path)
    .send({ ...current, contactIds: [] })
    .expect(200);
  const answer = await agent.delete(`/api/contacts/${contactIds[0]}?version=1`).expect(409);
  expect(answer.body.detail).toContain('A takeoff was sent to this contact');
});
