import type { Knex } from 'knex';

import { runSchema, type Run, type RunInput } from '@/api/contracts/run';
import type { RowSeen } from './job-rows';
import { toQuantityOrNull, typedOf, type TypedColumn } from './quantity-columns';

type RunRow = {
  id: string;
  version: number;
  number: string;
  title: string;
  service_id: string;
  place_id: string;
  level_id: string;
  drawing_id: string | null;
  shape: unknown;
  elevation: number | null;
  elevation_typed: TypedColumn;
  fittings: unknown;
  status: string;
  hold: unknown;
  override: unknown;
  note: string;
};
type References = { service_id: string } | { place_id: string } | { level_id: string } | { drawing_id: string };

export function createRunRepository(transaction: Knex.Transaction, firmId: string) {
  const runsOf = (jobId: string) => transaction('runs').where({ firm_id: firmId, job_id: jobId });
  return {
    async list(jobId: string): Promise<Run[]> {
      const rows: RunRow[] = await runsOf(jobId).orderBy('entered');
      return rows.map(toRun);
    },
    async among(jobId: string, ids: readonly string[]): Promise<Run[]> {
      const rows: RunRow[] = await runsOf(jobId).whereIn('id', ids);
      return rows.map(toRun);
    },
    /** Which of these ids stand in another job of this firm. */
    async elsewhere(jobId: string, ids: readonly string[]): Promise<Set<string>> {
      const rows: { id: string }[] = await transaction('runs')
        .where({ firm_id: firmId })
        .whereNot({ job_id: jobId })
        .whereIn('id', ids)
        .select('id');
      return new Set(rows.map(({ id }) => id));
    },
    async numbers(jobId: string): Promise<{ id: string; number: string }[]> {
      return runsOf(jobId).select('id', 'number');
    },
    count: async (jobId: string, references: References): Promise<number> => {
      const rows: { count: number }[] = await runsOf(jobId).where(references).count();
      return rows[0]?.count ?? 0;
    },
    /** Inserts new runs (version 0) and updates those still at the version that was seen: one statement for all. */
    async save(jobId: string, runs: readonly (RunInput & RowSeen)[]): Promise<Run[]> {
      if (runs.length === 0) return [];
      const rows = runs.map((run) => ({ firm_id: firmId, job_id: jobId, ...toColumns(run) }));
      const saved: RunRow[] = await transaction('runs')
        .insert(rows)
        .onConflict(['firm_id', 'id'])
        .merge([...mergedColumns])
        .whereRaw('runs.job_id = excluded.job_id and runs.version = excluded.version - 1')
        .returning('*');
      const byId = new Map(saved.map((row) => [row.id, toRun(row)]));
      return runs.flatMap(({ id }) => byId.get(id) ?? []);
    },
    async remove(jobId: string, ids: readonly string[]): Promise<void> {
      if (ids.length > 0) await runsOf(jobId).whereIn('id', ids).delete();
    },
  };
}
export type RunRepository = ReturnType<typeof createRunRepository>;

const toColumns = (run: RunInput & RowSeen) => ({
  id: run.id,
  version: run.version + 1,
  updated_at: new Date(),
  number: run.number,
  title: run.title,
  service_id: run.serviceId,
  place_id: run.placeId,
  level_id: run.levelId,
  drawing_id: run.drawingId,
  shape: JSON.stringify(run.shape),
  elevation: run.elevation?.value ?? null,
  elevation_typed: typedOf(run.elevation),
  fittings: JSON.stringify(run.fittings),
  status: run.status,
  hold: run.hold && JSON.stringify(run.hold),
  override: run.override && JSON.stringify(run.override),
  note: run.note,
});
type Column = keyof ReturnType<typeof toColumns>;
const mergedColumns = [
  'version',
  'updated_at',
  'number',
  'title',
  'service_id',
  'place_id',
  'level_id',
  'drawing_id',
  'shape',
  'elevation',
  'elevation_typed',
  'fittings',
  'status',
  'hold',
  'override',
  'note',
] as const satisfies readonly Column[];

const toRun = (row: RunRow): Run =>
  runSchema.parse({
    id: row.id,
    version: row.version,
    number: row.number,
    title: row.title,
    serviceId: row.service_id,
    placeId: row.place_id,
    levelId: row.level_id,
    drawingId: row.drawing_id,
    shape: row.shape,
    elevation: toQuantityOrNull(row.elevation, row.elevation_typed),
    fittings: row.fittings,
    status: row.status,
    hold: row.hold,
    override: row.override,
    note: row.note,
  });
