import type { Place, PlaceInput } from '@/api/contracts/place';
import type { Behind, WithFirm } from '@/db/with-firm';

import type { Fields } from './field-problems';
import { createJobRowService, type RowOfJob, type Uses } from './job-rows';
import { ductLocationFields } from './library-checks';

export const createPlaceService = ({ withFirm }: { withFirm: WithFirm }) =>
  createJobRowService<PlaceInput, Place>(withFirm, {
    noun: 'place',
    rows: ({ places }) => places,
    unique: { field: 'name', of: ({ name }) => name },
    check: (_behind, { input }) => placeFields(input),
    uses: usesOfPlace,
  });
export type PlaceService = ReturnType<typeof createPlaceService>;

/** Where the public reaches a surface, nobody but the project can say how hot it may be. */
function placeFields({ reach, touchLimit, ductLocation }: PlaceInput): Fields {
  const fields = ductLocationFields('ductLocation', ductLocation);
  const unlimited = reach === 'public' && touchLimit === null;
  return unlimited ? { ...fields, touchLimit: 'Where the public can reach it, a touch limit must be given' } : fields;
}

async function usesOfPlace({ runs, buildUps, specification, services }: Behind, { job, id }: RowOfJob): Promise<Uses> {
  const limited = (await services.list(job)).filter(({ limits }) => limits.some(({ placeId }) => placeId === id));
  return [
    [await runs.count(job, { place_id: id }), 'run', 'runs'],
    [await buildUps.countOfPlace(job, id), 'build-up', 'build-ups'],
    [await specification.countOfPlace(job, id), 'specification row', 'specification rows'],
    [limited.length, 'service with a limit for it', 'services with a limit for it'],
  ];
}
