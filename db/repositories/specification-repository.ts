import type { Knex } from 'knex';

import { specificationRowSchema, type SpecificationRow, type SpecificationRowInput } from '@/api/contracts/build-up';
import { fromCoveringColumns, toCoveringColumns, type CoveringRow } from './build-up-repository';
import { createScopedRows } from './scoped-rows';

type Row = CoveringRow & { label: string };

export const createSpecificationRepository = (transaction: Knex.Transaction, firmId: string) =>
  createScopedRows(transaction, firmId, { table: 'specification_rows', order: [], toColumns, toContract });
export type SpecificationRepository = ReturnType<typeof createSpecificationRepository>;

const toColumns = (input: SpecificationRowInput) => ({ ...toCoveringColumns(input), label: input.label });

const toContract = (row: Row): SpecificationRow =>
  specificationRowSchema.parse({ ...fromCoveringColumns(row), label: row.label });
