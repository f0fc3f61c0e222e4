import type { Knex } from 'knex';

import { buildUpSchema, type BuildUp, type BuildUpInput } from '@/api/contracts/build-up';
import { createScopedRows } from './scoped-rows';

/** The columns that build-ups and specification rows share. */
export type CoveringRow = {
  id: string;
  version: number;
  service_id: string;
  applies_to: string;
  from_dn: number | null;
  to_dn: number | null;
  layers: unknown;
  finish_id: string;
  vapour_retarder: string;
  note: string;
};

export const createBuildUpRepository = (transaction: Knex.Transaction, firmId: string) =>
  createScopedRows(transaction, firmId, {
    table: 'build_ups',
    order: [],
    toColumns: toCoveringColumns,
    toContract: (row: CoveringRow): BuildUp => buildUpSchema.parse(fromCoveringColumns(row)),
  });
export type BuildUpRepository = ReturnType<typeof createBuildUpRepository>;

export const toCoveringColumns = (input: BuildUpInput) => ({
  service_id: input.serviceId,
  applies_to: input.appliesTo,
  from_dn: input.fromDn,
  to_dn: input.toDn,
  layers: JSON.stringify(input.layers),
  finish_id: input.finishId,
  vapour_retarder: input.vapourRetarder,
  note: input.note,
});

export const fromCoveringColumns = (row: CoveringRow) => ({
  id: row.id,
  version: row.version,
  serviceId: row.service_id,
  appliesTo: row.applies_to,
  placeIds: [],
  fromDn: row.from_dn,
  toDn: row.to_dn,
  layers: row.layers,
  finishId: row.finish_id,
  vapourRetarder: row.vapour_retarder,
  note: row.note,
});
