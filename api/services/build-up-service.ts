import type { BuildUp, BuildUpInput } from '@/api/contracts/build-up';
import type { Behind, WithFirm } from '@/db/with-firm';

import { listFields, type Fields } from './field-problems';
import { createJobRowService } from './job-rows';
import { finishFields, layersFields } from './library-checks';

export const createBuildUpService = ({ withFirm }: { withFirm: WithFirm }) =>
  createJobRowService<BuildUpInput, BuildUp>(withFirm, {
    noun: 'build-up',
    rows: ({ buildUps }) => buildUps,
    check: (behind, { job, input }) => coveringFields(behind, job, input),
  });
export type BuildUpService = ReturnType<typeof createBuildUpService>;

/** What build-ups and specification rows must both keep: references within the job, rows of the library. */
export async function coveringFields(behind: Behind, job: string, input: BuildUpInput): Promise<Fields> {
  const services = await behind.services.ids(job);
  const { fromDn, toDn } = input;
  return {
    ...(services.has(input.serviceId) ? {} : { serviceId: 'Not a service of this job' }),
    ...listFields('placeIds', input.placeIds, await behind.places.ids(job)),
    ...(fromDn !== null && toDn !== null && fromDn > toDn ? { toDn: 'Must not be smaller than the first size' } : {}),
    ...layersFields('layers', input.layers),
    ...finishFields('finishId', input.finishId),
  };
}
