import type { Knex } from 'knex';

import type { Drawing, DrawingInput } from '@/api/contracts/basis';
import { createJobRows } from './job-rows';

type DrawingRow = Drawing;

export const createDrawingRepository = (transaction: Knex.Transaction, firmId: string) =>
  createJobRows(transaction, firmId, { table: 'drawings', order: ['number'], toColumns, toContract });
export type DrawingRepository = ReturnType<typeof createDrawingRepository>;

const toColumns = ({ number, title, revision, date, scale }: DrawingInput) => ({
  number,
  title,
  revision,
  date,
  scale,
});

const toContract = ({ id, version, number, title, revision, date, scale }: DrawingRow): Drawing => ({
  id,
  version,
  number,
  title,
  revision,
  date,
  scale,
});
