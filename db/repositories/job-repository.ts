import type { Knex } from 'knex';

import { jobSchema, type Job, type JobInput, type JobSummary } from '@/api/contracts/job';
import type { RowSeen } from './job-rows';
import { toQuantity, typedOf, type TypedColumn } from './quantity-columns';

type JobRow = {
  id: string;
  version: number;
  number: string;
  name: string;
  site: string;
  scope: string;
  bid_due_date: string | null;
  bid_due_time: string | null;
  bid_due_zone: string | null;
  currency: string;
  code_edition: string;
  climate_zone: string;
  altitude: number;
  altitude_typed: TypedColumn;
  document_units: string;
  series_unit: string;
  surface_method: string;
  specification_number: string;
  specification_title: string;
  specification_revision: string;
  specification_date: string | null;
  contact_ids: string[];
};
type SummaryRow = JobRow & { runs: number; on_hold: number; last_revision: string | null };

export function createJobRepository(transaction: Knex.Transaction, firmId: string) {
  const jobs = () => transaction('jobs').where({ 'jobs.firm_id': firmId });

  async function find(id: string): Promise<Job | undefined> {
    const contacts = transaction('job_contacts')
      .whereRaw('job_contacts.firm_id = jobs.firm_id and job_contacts.job_id = jobs.id')
      .select(transaction.raw("coalesce(json_agg(contact_id order by position), '[]')"))
      .as('contact_ids');
    const row: JobRow | undefined = await jobs().where({ id }).select('jobs.*', contacts).first();
    return row && toJob(row);
  }

  async function setContacts(jobId: string, contactIds: readonly string[]): Promise<void> {
    await transaction('job_contacts').where({ firm_id: firmId, job_id: jobId }).delete();
    const rows = contactIds.map((contact_id, position) => ({ firm_id: firmId, job_id: jobId, contact_id, position }));
    if (rows.length > 0) await transaction('job_contacts').insert(rows);
  }

  return {
    find,
    async list(): Promise<JobSummary[]> {
      const counted = transaction('runs')
        .where({ firm_id: firmId })
        .groupBy('job_id')
        .select('job_id', transaction.raw("count(*) as runs, count(*) filter (where status = 'on-hold') as on_hold"))
        .as('counted');
      const last = transaction('revisions')
        .where({ firm_id: firmId })
        .distinctOn('job_id')
        .orderBy([{ column: 'job_id' }, { column: 'ordinal', order: 'desc' }])
        .select('job_id', 'letter as last_revision')
        .as('last');
      const rows: SummaryRow[] = await jobs()
        .leftJoin(counted, 'counted.job_id', 'jobs.id')
        .leftJoin(last, 'last.job_id', 'jobs.id')
        .orderByRaw('jobs.bid_due_date desc nulls last, jobs.bid_due_time desc, jobs.entered desc')
        .select('jobs.*', 'last_revision')
        .select(transaction.raw('coalesce(runs, 0) as runs, coalesce(on_hold, 0) as on_hold'));
      return rows.map(toSummary);
    },
    async exists(id: string): Promise<boolean> {
      const row: unknown = await jobs().where({ id }).select('id').first();
      return row !== undefined;
    },
    /** Holds the job for this transaction, so that checks and writes of its rows cannot be overtaken. */
    async hold(id: string): Promise<boolean> {
      const row: unknown = await jobs().where({ id }).forNoKeyUpdate().select('id').first();
      return row !== undefined;
    },
    /** Keeps the job's rows as they are for this transaction, so that what is read goes together. */
    async holdStill(id: string): Promise<boolean> {
      const row: unknown = await jobs().where({ id }).forShare().select('id').first();
      return row !== undefined;
    },
    /** Makes writes of job numbers wait for each other, then says whether another job has this one. */
    async isTaken(number: string, besides: string | null): Promise<boolean> {
      await transaction.raw('select pg_advisory_xact_lock(hashtextextended(?, 1))', [firmId]);
      const row: { id: string } | undefined = await jobs().where({ number }).select('id').first();
      return row !== undefined && row.id !== besides;
    },
    async insert(input: JobInput): Promise<Job> {
      const rows: JobRow[] = await transaction('jobs')
        .insert({ firm_id: firmId, ...toColumns(input) })
        .returning('id');
      await setContacts(rows[0]!.id, input.contactIds);
      return (await find(rows[0]!.id))!;
    },
    /** Gives undefined when the row is not at the version that was seen. */
    async update({ id, version }: RowSeen, input: JobInput): Promise<Job | undefined> {
      const change = { ...toColumns(input), version: version + 1, updated_at: transaction.fn.now() };
      if ((await jobs().where({ id, version }).update(change)) === 0) return undefined;
      await setContacts(id, input.contactIds);
      return find(id);
    },
  };
}
export type JobRepository = ReturnType<typeof createJobRepository>;

const toColumns = (job: JobInput) => ({
  number: job.number,
  name: job.name,
  site: job.site,
  scope: job.scope,
  bid_due_date: job.bidDue?.date ?? null,
  bid_due_time: job.bidDue?.time ?? null,
  bid_due_zone: job.bidDue?.zone ?? null,
  currency: job.currency,
  code_edition: job.codeEdition,
  climate_zone: job.climateZone,
  altitude: job.altitude.value,
  altitude_typed: typedOf(job.altitude),
  document_units: job.documentUnits,
  series_unit: job.seriesUnit,
  surface_method: job.surfaceMethod,
  specification_number: job.specification.number,
  specification_title: job.specification.title,
  specification_revision: job.specification.revision,
  specification_date: job.specification.date,
});

const toJob = (row: JobRow): Job =>
  jobSchema.parse({
    id: row.id,
    version: row.version,
    number: row.number,
    name: row.name,
    site: row.site,
    scope: row.scope,
    contactIds: row.contact_ids,
    bidDue: toMoment(row),
    currency: row.currency,
    codeEdition: row.code_edition,
    climateZone: row.climate_zone,
    altitude: toQuantity(row.altitude, row.altitude_typed),
    documentUnits: row.document_units,
    seriesUnit: row.series_unit,
    surfaceMethod: row.surface_method,
    specification: {
      number: row.specification_number,
      title: row.specification_title,
      revision: row.specification_revision,
      date: row.specification_date,
    },
  });

const toMoment = ({ bid_due_date: date, bid_due_time: time, bid_due_zone: zone }: JobRow) =>
  date !== null && time !== null && zone !== null ? { date, time, zone } : null;

const toSummary = (row: SummaryRow): JobSummary => ({
  id: row.id,
  number: row.number,
  name: row.name,
  site: row.site,
  bidDue: toMoment(row),
  runs: row.runs,
  onHold: row.on_hold,
  lastRevision: row.last_revision,
});
