import type { Knex } from 'knex';

import { placeSchema, type Place, type PlaceInput } from '@/api/contracts/place';
import { createJobRows } from './job-rows';
import { toQuantityOrNull, typedOf, type TypedColumn } from './quantity-columns';

type PlaceRow = {
  id: string;
  version: number;
  name: string;
  reach: string;
  touch_limit: number | null;
  touch_limit_typed: TypedColumn;
  touch_limit_source: string;
  outdoor: boolean;
  plenum: boolean;
  duct_location: string | null;
  note: string;
  conditions: unknown;
};

export const createPlaceRepository = (transaction: Knex.Transaction, firmId: string) =>
  createJobRows(transaction, firmId, { table: 'places', order: [], toColumns, toContract });
export type PlaceRepository = ReturnType<typeof createPlaceRepository>;

const toColumns = (place: PlaceInput) => ({
  name: place.name,
  reach: place.reach,
  touch_limit: place.touchLimit?.value ?? null,
  touch_limit_typed: typedOf(place.touchLimit),
  touch_limit_source: place.touchLimitSource,
  outdoor: place.outdoor,
  plenum: place.plenum,
  duct_location: place.ductLocation,
  note: place.note,
  conditions: JSON.stringify(place.conditions),
});

const toContract = (row: PlaceRow): Place =>
  placeSchema.parse({
    id: row.id,
    version: row.version,
    name: row.name,
    reach: row.reach,
    touchLimit: toQuantityOrNull(row.touch_limit, row.touch_limit_typed),
    touchLimitSource: row.touch_limit_source,
    outdoor: row.outdoor,
    plenum: row.plenum,
    ductLocation: row.duct_location,
    note: row.note,
    conditions: row.conditions,
  });
