import type { Place } from '@/api/contracts/place';
import { DeleteButton } from '@/components/job/delete-button';
import { useRowRoutes } from '@/components/job/use-row-routes';
import { useUses } from '@/components/job/use-uses';
import { FactList } from '@/components/ui/fact-list';
import { LinkButton } from '@/components/ui/link';
import { Loading } from '@/components/ui/loading';
import { usePlaceActions } from '@/hooks/use-places';
import { useMay } from '@/hooks/use-session';
import { useUnits } from '@/hooks/use-units';

import { placeFacts } from './place-facts';
import { PlaceForm } from './place-form';
import { useDuctLocations } from './use-duct-locations';

type PlaceDetailProps = { jobId: string; place: Place | null; copyOf?: Place };

/** A place to change, for who may; to read, for everyone else. */
export function PlaceDetail({ jobId, place, copyOf }: PlaceDetailProps) {
  const { units } = useUnits();
  const mayEdit = useMay('edit-jobs');
  const ductLocations = useDuctLocations(jobId);
  const routes = useRowRoutes({ list: `/jobs/${jobId}/places`, one: (id) => `/jobs/${jobId}/places/${id}` });
  if (!ductLocations) return <Loading label="Place" shape="form" />;
  if (place && !mayEdit) return <FactList facts={placeFacts(place, { units, ductLocations }).filter(isSaid)} />;
  return (
    <PlaceForm
      jobId={jobId}
      place={place}
      copyOf={copyOf}
      ductLocations={ductLocations}
      onSaved={({ id, name }) =>
        place ? routes.changed(`${name} is saved.`) : routes.created(id, `${name} is added.`)
      }
      onCancel={place ? undefined : routes.cancel}
      actions={place ? <PlaceActions jobId={jobId} place={place} onDeleted={routes.gone} /> : undefined}
    />
  );
}

// the title says the name
const isSaid = ({ term, value }: { term: string; value: string }) => value !== '' && term !== 'Name';

type PlaceActionsProps = { jobId: string; place: Place; onDeleted: () => void };

function PlaceActions({ jobId, place, onDeleted }: PlaceActionsProps) {
  const { remove } = usePlaceActions(jobId);
  const uses = useUses(jobId, { by: 'placeId', id: place.id });
  return (
    <>
      <LinkButton href={`/jobs/${jobId}/places/new?from=${place.id}`} label="Copy to a new one" />
      <DeleteButton noun="place" name={place.name} uses={uses} onDelete={() => remove(place)} onDeleted={onDeleted} />
    </>
  );
}
