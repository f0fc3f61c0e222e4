import type { Service, ServiceInput, ServiceLimit } from '@/api/contracts/service';
import type { Behind, WithFirm } from '@/db/with-firm';

import type { Fields } from './field-problems';
import { createJobRowService, type RowOfJob, type Uses } from './job-rows';

export const createServiceService = ({ withFirm }: { withFirm: WithFirm }) =>
  createJobRowService<ServiceInput, Service>(withFirm, {
    noun: 'service',
    rows: ({ services }) => services,
    unique: { field: 'name', of: ({ name }) => name },
    check: async ({ places }, { job, input }) => limitsFields(input.limits, await places.ids(job)),
    uses: usesOfService,
  });
export type ServiceService = ReturnType<typeof createServiceService>;

/** Each limit stands once for each place, names a place of this job, and says what it limits. */
function limitsFields(limits: readonly ServiceLimit[], places: ReadonlySet<string>): Fields {
  const fields: Fields = {};
  limits.forEach((limit, index) => {
    const { kind, placeId } = limit;
    if (placeId !== null && !places.has(placeId)) fields[`limits.${index}.placeId`] = 'Not a place of this job';
    const first = limits.findIndex((other) => other.kind === kind && other.placeId === placeId);
    if (first < index) fields[`limits.${index}.kind`] = 'This limit stands here already for the same place';
    if (limit.kind === 'heat-flow' && limit.perLength === null && limit.flux === null) {
      fields[`limits.${index}.perLength`] = 'Give a limit for each metre or for each square metre';
    }
  });
  return fields;
}

async function usesOfService({ runs, buildUps, specification }: Behind, { job, id }: RowOfJob): Promise<Uses> {
  return [
    [await runs.count(job, { service_id: id }), 'run', 'runs'],
    [await buildUps.countOfService(job, id), 'build-up', 'build-ups'],
    [await specification.countOfService(job, id), 'specification row', 'specification rows'],
  ];
}
