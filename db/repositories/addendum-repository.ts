import type { Knex } from 'knex';

import type { Addendum, AddendumInput } from '@/api/contracts/basis';
import { createJobRows } from './job-rows';

type AddendumRow = Addendum;

export const createAddendumRepository = (transaction: Knex.Transaction, firmId: string) =>
  createJobRows(transaction, firmId, { table: 'addenda', order: ['number'], toColumns, toContract });
export type AddendumRepository = ReturnType<typeof createAddendumRepository>;

const toColumns = ({ number, date, changes, acknowledged }: AddendumInput) => ({
  number,
  date,
  changes,
  acknowledged,
});

const toContract = ({ id, version, number, date, changes, acknowledged }: AddendumRow): Addendum => ({
  id,
  version,
  number,
  date,
  changes,
  acknowledged,
});
