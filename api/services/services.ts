import type { Clock } from '@/api/adapters/clock';
import type { Doors } from '@/db/repositories/doors';
import type { WithFirm } from '@/db/with-firm';

import { createBasisService } from './basis-service';
import { createBuildUpService } from './build-up-service';
import { createContactService } from './contact-service';
import { createJobService } from './job-service';
import { createLibraryService } from './library-service';
import { createLinkService } from './link-service';
import { createMemberService } from './member-service';
import { createMessageService } from './message-service';
import { createPlaceService } from './place-service';
import { createRenderingService } from './rendering-service';
import { createRevisionSending } from './revision-sending';
import { createRevisionService } from './revision-service';
import { createRunService } from './run-service';
import { createServiceService } from './service-service';
import { createSessionService } from './session-service';
import { createSpecificationService } from './specification-service';
import { createStudyService } from './study-service';

/** What of the configuration the services need to know. */
export type ServiceSettings = { bcryptCost: number; publicUrl: string };
export type ServiceParts = { withFirm: WithFirm; doors: Doors; clock: Clock; settings: ServiceSettings };

/** Every service, built once and alike for server, worker, seed and tests. */
export function createServices({ withFirm, doors, clock, settings }: ServiceParts) {
  const { bcryptCost, publicUrl } = settings;
  return {
    session: createSessionService({ withFirm, doors, clock, bcryptCost }),
    member: createMemberService({ withFirm, doors, bcryptCost }),
    job: createJobService({ withFirm }),
    contact: createContactService({ withFirm }),
    basis: createBasisService({ withFirm }),
    place: createPlaceService({ withFirm }),
    service: createServiceService({ withFirm }),
    buildUp: createBuildUpService({ withFirm }),
    specification: createSpecificationService({ withFirm }),
    run: createRunService({ withFirm }),
    study: createStudyService({ withFirm }),
    library: createLibraryService(),
    revision: {
      ...createRevisionService({ withFirm, clock }),
      ...createRevisionSending({ withFirm, clock, publicUrl }),
    },
    rendering: createRenderingService({ withFirm }),
    message: createMessageService({ withFirm, clock }),
    link: createLinkService({ doors: doors.link, clock }),
  };
}
export type Services = ReturnType<typeof createServices>;
