import type { Knex } from 'knex';

import type { Level, LevelInput } from '@/api/contracts/basis';
import { createJobRows } from './job-rows';

type LevelRow = { id: string; version: number; name: string; position: number };

export const createLevelRepository = (transaction: Knex.Transaction, firmId: string) =>
  createJobRows(transaction, firmId, {
    table: 'levels',
    order: ['position'],
    toColumns: ({ name, position }: LevelInput) => ({ name, position }),
    toContract: ({ id, version, name, position }: LevelRow): Level => ({ id, version, name, position }),
  });
export type LevelRepository = ReturnType<typeof createLevelRepository>;
