import type { Clock } from '@/api/adapters/clock';
import type { Doors } from '@/db/repositories/doors';
import type { WithFirm } from '@/db/with-firm';

import { createMemberService } from './member-service';
import { createSessionService } from './session-service';

/** What of the configuration the services need to know. */
export type ServiceSettings = { bcryptCost: number; publicUrl: string };
export type ServiceParts = { withFirm: WithFirm; doors: Doors; clock: Clock; settings: ServiceSettings };

/** Every service, built once and alike for server, worker, seed and tests. */
export function createServices({ withFirm, doors, clock, settings }: ServiceParts) {
  const { bcryptCost } = settings;
  return {
    session: createSessionService({ withFirm, doors, clock, bcryptCost }),
    member: createMemberService({ withFirm, doors, bcryptCost }),
  };
}
export type Services = ReturnType<typeof createServices>;
