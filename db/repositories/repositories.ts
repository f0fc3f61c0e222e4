import type { Knex } from 'knex';

import { createFirmRepository } from './firm-repository';
import { createMemberRepository } from './member-repository';

/** Every repository, made for one firm inside its transaction. A new one is added here and nowhere else. */
export function createRepositories(transaction: Knex.Transaction, firmId: string) {
  return {
    firm: createFirmRepository(transaction, firmId),
    members: createMemberRepository(transaction, firmId),
  };
}
export type Repositories = ReturnType<typeof createRepositories>;
