import type { Knex } from 'knex';

import { createJobRows, type JobRows, type RowSeen, type RowShape } from './job-rows';

type Scope = { id: string; placeIds: string[] };
type Count = { count: number };
/** Rows that apply in places; says how many of them refer to a service or a place. */
export type ScopedRows<Input, Contract> = JobRows<Input, Contract> & {
  countOfService(jobId: string, serviceId: string): Promise<number>;
  countOfPlace(jobId: string, placeId: string): Promise<number>;
};
type Link = { row_id: string; place_id: string };

/** Rows of a job that apply in some of its places: the places stand in a table of their own. */
export function createScopedRows<Row, Input extends { placeIds: string[] }, Contract extends Scope>(
  transaction: Knex.Transaction,
  firmId: string,
  shape: RowShape<Row, Input, Contract>,
): ScopedRows<Input, Contract> {
  const rows = createJobRows(transaction, firmId, shape);
  const links = `${shape.table}_places`;
  const linksOf = (jobId: string) => transaction(links).where({ firm_id: firmId, job_id: jobId });

  async function placesOf(jobId: string, only?: string): Promise<Map<string, string[]>> {
    const found: Link[] = await linksOf(jobId)
      .where(only ? { row_id: only } : {})
      .orderBy('position');
    const places = new Map<string, string[]>();
    for (const { row_id, place_id } of found) places.set(row_id, [...(places.get(row_id) ?? []), place_id]);
    return places;
  }

  async function setPlaces(jobId: string, row: Contract, placeIds: string[]): Promise<Contract> {
    await linksOf(jobId).where({ row_id: row.id }).delete();
    const columns = { firm_id: firmId, job_id: jobId, row_id: row.id };
    const made = placeIds.map((place_id, position) => ({ ...columns, place_id, position }));
    if (made.length > 0) await transaction(links).insert(made);
    return { ...row, placeIds };
  }

  return {
    ...rows,
    async list(jobId) {
      const [found, places] = [await rows.list(jobId), await placesOf(jobId)];
      return found.map((row) => ({ ...row, placeIds: places.get(row.id) ?? [] }));
    },
    async find(jobId, id) {
      const row = await rows.find(jobId, id);
      return row && { ...row, placeIds: (await placesOf(jobId, id)).get(id) ?? [] };
    },
    insert: async (jobId, input) => setPlaces(jobId, await rows.insert(jobId, input), input.placeIds),
    async update(jobId: string, seen: RowSeen, input: Input) {
      const row = await rows.update(jobId, seen, input);
      return row && setPlaces(jobId, row, input.placeIds);
    },
    async countOfService(jobId, serviceId) {
      const found: Count[] = await transaction(shape.table)
        .where({ firm_id: firmId, job_id: jobId, service_id: serviceId })
        .count();
      return found[0]!.count;
    },
    async countOfPlace(jobId, placeId) {
      const found: Count[] = await linksOf(jobId).where({ place_id: placeId }).count();
      return found[0]!.count;
    },
  };
}
