import type { Knex } from 'knex';

export type RowSeen = { id: string; version: number };
/** How rows of one table become a contract and back; `order` names the columns a list is sorted by. */
export type RowShape<Row, Input, Contract> = {
  table: string;
  order: string[];
  toContract: (row: Row) => Contract;
  toColumns: (input: Input) => Record<string, unknown>;
};

/** Reads and writes the rows of one table that hang on a job: the same for each noun. */
export function createJobRows<Row, Input, Contract>(
  transaction: Knex.Transaction,
  firmId: string,
  { table, order, toContract, toColumns }: RowShape<Row, Input, Contract>,
) {
  const rowsOf = (jobId: string) => transaction(table).where({ firm_id: firmId, job_id: jobId });
  const rows = {
    async list(jobId: string): Promise<Contract[]> {
      const found: Row[] = await rowsOf(jobId).orderBy([...order, 'entered']);
      return found.map(toContract);
    },
    async ids(jobId: string): Promise<Set<string>> {
      const found: { id: string }[] = await rowsOf(jobId).select('id');
      return new Set(found.map(({ id }) => id));
    },
    async find(jobId: string, id: string): Promise<Contract | undefined> {
      const found: Row | undefined = await rowsOf(jobId).where({ id }).first();
      return found && toContract(found);
    },
    async insert(jobId: string, input: Input): Promise<Contract> {
      const columns = { firm_id: firmId, job_id: jobId, ...toColumns(input) };
      const made: Row[] = await transaction(table).insert(columns).returning('*');
      return toContract(made[0]!);
    },
    /** Gives undefined when the row is not at the version that was seen. */
    async update(jobId: string, { id, version }: RowSeen, input: Input): Promise<Contract | undefined> {
      const change = { ...toColumns(input), version: version + 1, updated_at: transaction.fn.now() };
      const changed: Row[] = await rowsOf(jobId).where({ id, version }).update(change).returning('*');
      return changed[0] && toContract(changed[0]);
    },
    remove: async (jobId: string, { id, version }: RowSeen): Promise<boolean> =>
      (await rowsOf(jobId).where({ id, version }).delete()) === 1,
  };
  return rows;
}
/** What a service needs of any noun that hangs on a job. */
export type JobRows<Input, Contract> = {
  list(jobId: string): Promise<Contract[]>;
  ids(jobId: string): Promise<Set<string>>;
  find(jobId: string, id: string): Promise<Contract | undefined>;
  insert(jobId: string, input: Input): Promise<Contract>;
  update(jobId: string, seen: RowSeen, input: Input): Promise<Contract | undefined>;
  remove(jobId: string, seen: RowSeen): Promise<boolean>;
};
