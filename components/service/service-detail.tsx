import type { Service } from '@/api/contracts/service';
import { DeleteButton } from '@/components/job/delete-button';
import { useRowRoutes } from '@/components/job/use-row-routes';
import { useUses } from '@/components/job/use-uses';
import { FactList } from '@/components/ui/fact-list';
import { LinkButton } from '@/components/ui/link';
import { Loading } from '@/components/ui/loading';
import { usePlaces } from '@/hooks/use-places';
import { useServiceActions, useServices } from '@/hooks/use-services';
import { useMay } from '@/hooks/use-session';
import { useUnits } from '@/hooks/use-units';

import { serviceFacts } from './service-facts';
import { ServiceForm } from './service-form';

type ServiceDetailProps = { jobId: string; service: Service | null; copyOf?: Service };

/** A service to change, for who may; to read, for everyone else. */
export function ServiceDetail({ jobId, service, copyOf }: ServiceDetailProps) {
  const { units } = useUnits();
  const mayEdit = useMay('edit-jobs');
  const { places } = usePlaces(jobId);
  const { services } = useServices(jobId);
  const routes = useRowRoutes({ list: `/jobs/${jobId}/services`, one: (id) => `/jobs/${jobId}/services/${id}` });
  if (!places || !services) return <Loading label="Service" shape="form" />;
  if (service && !mayEdit) return <FactList facts={serviceFacts(service, { units, places }).filter(isSaid)} />;
  const position = Math.min(999, Math.max(0, ...services.map((other) => other.position)) + 1);
  return (
    <ServiceForm
      jobId={jobId}
      service={service}
      copyOf={copyOf}
      position={position}
      places={places}
      onSaved={({ id, name }) =>
        service ? routes.changed(`${name} is saved.`) : routes.created(id, `${name} is added.`)
      }
      onCancel={service ? undefined : routes.cancel}
      actions={service ? <ServiceActions jobId={jobId} service={service} onDeleted={routes.gone} /> : undefined}
    />
  );
}

// the title says the name
const isSaid = ({ term, value }: { term: string; value: string }) => value !== '' && term !== 'Name';

type ServiceActionsProps = { jobId: string; service: Service; onDeleted: () => void };

function ServiceActions({ jobId, service, onDeleted }: ServiceActionsProps) {
  const { remove } = useServiceActions(jobId);
  const uses = useUses(jobId, { by: 'serviceId', id: service.id });
  return (
    <>
      <LinkButton href={`/jobs/${jobId}/services/new?from=${service.id}`} label="Copy to a new one" />
      <DeleteButton
        noun="service"
        name={service.name}
        uses={uses}
        onDelete={() => remove(service)}
        onDeleted={onDeleted}
      />
    </>
  );
}
