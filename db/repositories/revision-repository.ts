import type { Knex } from 'knex';

import type { Revision, Snapshot } from '@/api/contracts/revision';

type RevisionRow = {
  id: string;
  job_id: string;
  letter: string;
  frozen_at: Date;
  frozen_by: string;
  valid_until: string;
  expires_at: Date;
  rendering: Revision['rendering'];
  pdf_hash: string | null;
  pdf_bytes: number | null;
  runs: number;
  flags: number;
  superseded_by: string | null;
};
/** Everything but the two big columns. */
const columns = [
  'id',
  'job_id',
  'letter',
  'frozen_at',
  'frozen_by',
  'valid_until',
  'expires_at',
  'rendering',
  'pdf_hash',
  'pdf_bytes',
  'runs',
  'flags',
].map((column) => `revisions.${column}`);

export type Freezing = {
  jobId: string;
  ordinal: number;
  letter: string;
  frozenAt: Date;
  frozenBy: string;
  validUntil: string;
  timeZone: string;
  snapshot: Snapshot;
};
/** Stored bytes, with what names their file: the job's number, the letter, the local date of freezing. */
export type StoredPdf = { number: string; letter: string; date: string; hash: string; bytes: Buffer };
/** A revision without what was sent of it, which has its own table. */
export type BareRevision = Omit<Revision, 'messages'> & { expiresAt: Date };

/** Frozen documents of jobs: what is inserted here stays as it is. */
export function createRevisionRepository(transaction: Knex.Transaction, firmId: string) {
  const revisions = () => transaction('revisions').where({ 'revisions.firm_id': firmId });
  const superseded = () =>
    transaction.raw('latest_letter(revisions.firm_id, revisions.job_id, revisions.ordinal) as superseded_by');
  const selected = () => revisions().select<RevisionRow[]>(...columns, superseded());
  return {
    async list(jobId: string): Promise<BareRevision[]> {
      const rows: RevisionRow[] = await selected().where({ job_id: jobId }).orderBy('ordinal', 'desc');
      return rows.map(toRevision);
    },
    async find(id: string): Promise<BareRevision | undefined> {
      const rows: RevisionRow[] = await selected().where({ id });
      return rows[0] && toRevision(rows[0]);
    },
    /** Holds the revision, so that two requests to send it see each other. */
    async hold(id: string): Promise<boolean> {
      const row: unknown = await revisions().where({ id }).forNoKeyUpdate().select('id').first();
      return row !== undefined;
    },
    async lastOrdinal(jobId: string): Promise<number> {
      const row: { ordinal: number } | undefined = await revisions()
        .where({ job_id: jobId })
        .orderBy('ordinal', 'desc')
        .select('ordinal')
        .first();
      return row?.ordinal ?? 0;
    },
    /** The link of a revision ends with the last day of its validity, in the job's time zone. */
    async insert({
      jobId,
      ordinal,
      letter,
      frozenAt,
      frozenBy,
      validUntil,
      timeZone,
      snapshot,
    }: Freezing): Promise<string> {
      const rows: { id: string }[] = await transaction('revisions')
        .insert({
          firm_id: firmId,
          job_id: jobId,
          ordinal,
          letter,
          frozen_at: frozenAt,
          frozen_by: frozenBy,
          valid_until: validUntil,
          expires_at: transaction.raw('(?::date + 1)::timestamp at time zone ?', [validUntil, timeZone]),
          snapshot: JSON.stringify(snapshot),
          runs: snapshot.runs.length,
          flags: snapshot.flags.length,
        })
        .returning('id');
      return rows[0]!.id;
    },
    /** As it was stored; whoever prints it parses it by its contract. */
    async snapshot(id: string): Promise<unknown> {
      const row: { snapshot: unknown } | undefined = await revisions().where({ id }).select('snapshot').first();
      return row?.snapshot;
    },
    async pdf(id: string): Promise<StoredPdf | undefined> {
      const row: StoredPdf | undefined = await revisions()
        .where({ id })
        .whereNotNull('pdf')
        .select('letter', 'pdf_hash as hash', 'pdf as bytes')
        .select(transaction.raw("snapshot #>> '{job,number}' as number"))
        .select(transaction.raw("to_char(frozen_at at time zone (snapshot ->> 'timeZone'), 'YYYY-MM-DD') as date"))
        .first();
      return row;
    },
    /** Stores the bytes once; false when they are there already. */
    async storePdf(id: string, bytes: Buffer, hash: string): Promise<boolean> {
      const change = { rendering: 'ready', pdf: bytes, pdf_hash: hash, pdf_bytes: bytes.length };
      return (await revisions().where({ id }).whereNull('pdf').update(change)) === 1;
    },
    async markFailed(id: string): Promise<void> {
      await revisions().where({ id }).whereNull('pdf').update({ rendering: 'failed' });
    },
  };
}
export type RevisionRepository = ReturnType<typeof createRevisionRepository>;

const toRevision = (row: RevisionRow): BareRevision => ({
  id: row.id,
  jobId: row.job_id,
  letter: row.letter,
  frozenAt: row.frozen_at.toISOString(),
  frozenBy: row.frozen_by,
  validUntil: row.valid_until,
  expiresAt: row.expires_at,
  rendering: row.rendering,
  pdfHash: row.pdf_hash,
  pdfBytes: row.pdf_bytes,
  supersededBy: row.superseded_by,
  runs: row.runs,
  flags: row.flags,
});
