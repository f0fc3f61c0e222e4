import type { BuildUp } from '@/api/contracts/build-up';
import { DeleteButton } from '@/components/job/delete-button';
import { useRowRoutes } from '@/components/job/use-row-routes';
import { FactList } from '@/components/ui/fact-list';
import { LinkButton } from '@/components/ui/link';
import { Loading } from '@/components/ui/loading';
import { useBuildUpActions } from '@/hooks/use-build-ups';
import { useMay } from '@/hooks/use-session';

import { BuildUpForm } from './build-up-form';
import { coveringFacts, nameIn } from './covering-words';
import { useCoveringChoices } from './use-covering-choices';

type BuildUpDetailProps = { jobId: string; buildUp: BuildUp | null; copyOf?: BuildUp };

/** A build-up to change, for who may; to read, for everyone else. */
export function BuildUpDetail({ jobId, buildUp, copyOf }: BuildUpDetailProps) {
  const mayEdit = useMay('edit-jobs');
  const choices = useCoveringChoices(jobId);
  const routes = useRowRoutes({ list: `/jobs/${jobId}/build-ups`, one: (id) => `/jobs/${jobId}/build-ups/${id}` });
  if (!choices) return <Loading label="Build-up" shape="form" />;
  const { names } = choices;
  if (buildUp && !mayEdit) return <FactList facts={coveringFacts(buildUp, names).filter(({ value }) => value)} />;
  return (
    <BuildUpForm
      jobId={jobId}
      buildUp={buildUp}
      copyOf={copyOf}
      choices={choices}
      onSaved={({ id, serviceId }) => {
        const name = `The build-up of ${nameIn(names.services, serviceId)}`;
        return buildUp ? routes.changed(`${name} is saved.`) : routes.created(id, `${name} is added.`);
      }}
      onCancel={buildUp ? undefined : routes.cancel}
      actions={
        buildUp ? (
          <BuildUpActions
            jobId={jobId}
            buildUp={buildUp}
            name={`the build-up of ${nameIn(names.services, buildUp.serviceId)}`}
            onDeleted={routes.gone}
          />
        ) : undefined
      }
    />
  );
}

type BuildUpActionsProps = { jobId: string; buildUp: BuildUp; name: string; onDeleted: () => void };

function BuildUpActions({ jobId, buildUp, name, onDeleted }: BuildUpActionsProps) {
  const { remove } = useBuildUpActions(jobId);
  return (
    <>
      <LinkButton href={`/jobs/${jobId}/build-ups/new?from=${buildUp.id}`} label="Copy to a new one" />
      <DeleteButton
        noun="build-up"
        name={name}
        consequence="Runs that no specification row covers are then without insulation."
        onDelete={() => remove(buildUp)}
        onDeleted={onDeleted}
      />
    </>
  );
}
