import type { Clock } from '@/api/adapters/clock';
import type { Revision } from '@/api/contracts/revision';
import type { Member } from '@/api/contracts/session';
import { takeoffFileName } from '@/api/documents/file-name';
import { renderTakeoff } from '@/api/documents/takeoff-pdf';
import { AppError } from '@/api/errors';
import type { Behind, WithFirm } from '@/db/with-firm';

import { allow } from './allow';
import { dateIn, daysAfter } from './calendar';
import { sha256 } from './hashes';
import { holdJob, must, noSuchJob } from './job-rows';
import { revisionLetter } from '@/api/contracts/revision-letter';
import { withMessages } from './revision-rows';
import { takeSnapshot, zoneOf } from './snapshot';

/** A finished document with the name under which it is saved. */
export type DocumentFile = { fileName: string; bytes: Buffer; hash: string };
type Parts = { withFirm: WithFirm; clock: Clock };

/** Frozen takeoffs: once frozen nothing recomputes them, once rendered their bytes stay. */
export function createRevisionService({ withFirm, clock }: Parts) {
  async function freezeIn(behind: Behind, member: Member, jobId: string): Promise<Revision> {
    await holdJob(behind, jobId);
    const data = must(await behind.jobData.load(jobId));
    const firm = await behind.firm.get();
    const frozenAt = clock();
    const timeZone = zoneOf(data, firm);
    const validUntil = daysAfter(dateIn(frozenAt, timeZone), firm.quoteValidDays);
    const ordinal = (await behind.revisions.lastOrdinal(jobId)) + 1;
    const letter = revisionLetter(ordinal);
    const snapshot = takeSnapshot({ data, firm, member, issue: { letter, frozenAt, validUntil } });
    const frozen = { jobId, ordinal, letter, frozenAt, frozenBy: member.name, validUntil, timeZone, snapshot };
    const id = await behind.revisions.insert(frozen);
    await behind.enqueue('render', { firmId: member.firmId, revisionId: id });
    return withMessages(must(await behind.revisions.find(id)), []);
  }
  return {
    /** The next letter of the job. @throws AppError `not-found` when this firm has no such job */
    freeze(member: Member, jobId: string): Promise<Revision> {
      allow(member, 'revise');
      return withFirm(member.firmId, (behind) => freezeIn(behind, member, jobId));
    },
    list(member: Member, jobId: string): Promise<Revision[]> {
      allow(member, 'see-jobs');
      return withFirm(member.firmId, async ({ jobs, revisions, messages }) => {
        if (!(await jobs.exists(jobId))) throw noSuchJob();
        const found = await revisions.list(jobId);
        const sent = await messages.ofRevisions(found.map(({ id }) => id));
        return found.map((revision) => withMessages(revision, sent));
      });
    },
    get(member: Member, id: string): Promise<Revision> {
      allow(member, 'see-jobs');
      return withFirm(member.firmId, async ({ revisions, messages }) => {
        const revision = await revisions.find(id);
        if (!revision) throw noSuchRevision();
        return withMessages(revision, await messages.ofRevisions([id]));
      });
    },
    /** The stored bytes. @throws AppError `unavailable` while they are being made */
    async pdf(member: Member, id: string): Promise<DocumentFile> {
      allow(member, 'see-jobs');
      return withFirm(member.firmId, async ({ revisions }) => {
        if (!(await revisions.find(id))) throw noSuchRevision();
        const stored = await revisions.pdf(id);
        if (!stored)
          throw new AppError('unavailable', 'The PDF is being made: try again in a moment', { retryAfter: 2 });
        const { number, letter, date } = stored;
        return { fileName: takeoffFileName({ number, letter, date }), bytes: stored.bytes, hash: stored.hash };
      });
    },
    /** The document as it would be now, marked DRAFT; nothing is stored. */
    async draft(member: Member, jobId: string): Promise<DocumentFile> {
      allow(member, 'see-jobs');
      const { data, firm } = await withFirm(member.firmId, async (behind) => ({
        data: await behind.jobData.load(jobId),
        firm: await behind.firm.get(),
      }));
      if (!data) throw noSuchJob();
      const now = clock();
      const snapshot = takeSnapshot({ data, firm, member, issue: { letter: null, frozenAt: null, validUntil: null } });
      const bytes = await renderTakeoff(snapshot, { draft: true, at: now.toISOString() });
      const date = dateIn(now, snapshot.timeZone);
      return { fileName: takeoffFileName({ number: data.job.number, letter: null, date }), bytes, hash: sha256(bytes) };
    },
  };
}
export type RevisionService = ReturnType<typeof createRevisionService>;

export const noSuchRevision = () => new AppError('not-found', 'This revision does not exist');
