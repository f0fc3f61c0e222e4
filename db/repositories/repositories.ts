import type { Knex } from 'knex';

import { createAddendumRepository } from './addendum-repository';
import { createBuildUpRepository } from './build-up-repository';
import { createContactRepository } from './contact-repository';
import { createDrawingRepository } from './drawing-repository';
import { createFirmRepository } from './firm-repository';
import { createJobDataRepository } from './job-data';
import { createJobRepository } from './job-repository';
import { createLevelRepository } from './level-repository';
import { createLinkRepository } from './link-repository';
import { createMemberRepository } from './member-repository';
import { createMessageRepository } from './message-repository';
import { createOutgoingRepository } from './outgoing-repository';
import { createPlaceRepository } from './place-repository';
import { createRevisionRepository } from './revision-repository';
import { createRunRepository } from './run-repository';
import { createServiceRepository } from './service-repository';
import { createSpecificationRepository } from './specification-repository';

/** Every repository, made for one firm inside its transaction. A new one is added here and nowhere else. */
export function createRepositories(transaction: Knex.Transaction, firmId: string) {
  const job = {
    jobs: createJobRepository(transaction, firmId),
    contacts: createContactRepository(transaction, firmId),
    levels: createLevelRepository(transaction, firmId),
    drawings: createDrawingRepository(transaction, firmId),
    addenda: createAddendumRepository(transaction, firmId),
    places: createPlaceRepository(transaction, firmId),
    services: createServiceRepository(transaction, firmId),
    buildUps: createBuildUpRepository(transaction, firmId),
    specification: createSpecificationRepository(transaction, firmId),
    runs: createRunRepository(transaction, firmId),
  };
  return {
    firm: createFirmRepository(transaction, firmId),
    members: createMemberRepository(transaction, firmId),
    ...job,
    jobData: createJobDataRepository(job),
    revisions: createRevisionRepository(transaction, firmId),
    messages: createMessageRepository(transaction, firmId),
    outgoing: createOutgoingRepository(transaction, firmId),
    links: createLinkRepository(transaction, firmId),
  };
}
export type Repositories = ReturnType<typeof createRepositories>;
