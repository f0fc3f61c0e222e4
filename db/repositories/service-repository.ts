import type { Knex } from 'knex';

import { serviceSchema, type Service, type ServiceInput } from '@/api/contracts/service';
import { createJobRows } from './job-rows';
import { toQuantity, typedOf, type TypedColumn } from './quantity-columns';

type ServiceRow = {
  id: string;
  version: number;
  name: string;
  fluid: string;
  states: unknown;
  hours: number;
  hours_typed: TypedColumn;
  code_exempt: string;
  limits: unknown;
  note: string;
  position: number;
};

export const createServiceRepository = (transaction: Knex.Transaction, firmId: string) =>
  createJobRows(transaction, firmId, { table: 'services', order: ['position'], toColumns, toContract });
export type ServiceRepository = ReturnType<typeof createServiceRepository>;

const toColumns = (service: ServiceInput) => ({
  name: service.name,
  fluid: service.fluid,
  states: JSON.stringify(service.states),
  hours: service.hours.value,
  hours_typed: typedOf(service.hours),
  code_exempt: service.codeExempt,
  limits: JSON.stringify(service.limits),
  note: service.note,
  position: service.position,
});

const toContract = (row: ServiceRow): Service =>
  serviceSchema.parse({
    id: row.id,
    version: row.version,
    name: row.name,
    fluid: row.fluid,
    states: row.states,
    hours: toQuantity(row.hours, row.hours_typed),
    codeExempt: row.code_exempt,
    limits: row.limits,
    note: row.note,
    position: row.position,
  });
