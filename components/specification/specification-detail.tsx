import type { SpecificationRow } from '@/api/contracts/build-up';
import { coveringFacts } from '@/components/build-up/covering-words';
import { useCoveringChoices } from '@/components/build-up/use-covering-choices';
import { DeleteButton } from '@/components/job/delete-button';
import { useRowRoutes } from '@/components/job/use-row-routes';
import { FactList } from '@/components/ui/fact-list';
import { LinkButton } from '@/components/ui/link';
import { Loading } from '@/components/ui/loading';
import { useMay } from '@/hooks/use-session';
import { useSpecification, useSpecificationActions } from '@/hooks/use-specification';

import { nextLabel } from './row-labels';
import { SpecificationForm } from './specification-form';

type SpecificationDetailProps = { jobId: string; row: SpecificationRow | null; copyOf?: SpecificationRow };

/** A row of the specification to change, for who may; to read, for everyone else. */
export function SpecificationDetail({ jobId, row, copyOf }: SpecificationDetailProps) {
  const mayEdit = useMay('edit-jobs');
  const choices = useCoveringChoices(jobId);
  const { specification } = useSpecification(jobId);
  const routes = useRowRoutes({
    list: `/jobs/${jobId}/specification`,
    one: (id) => `/jobs/${jobId}/specification/${id}`,
  });
  if (!choices || !specification) return <Loading label="Specification" shape="form" />;
  if (row && !mayEdit) return <FactList facts={coveringFacts(row, choices.names).filter(({ value }) => value)} />;
  return (
    <SpecificationForm
      jobId={jobId}
      row={row}
      copyOf={copyOf}
      label={nextLabel(specification)}
      choices={choices}
      onSaved={({ id, label }) =>
        row ? routes.changed(`${label} is saved.`) : routes.created(id, `${label} is added.`)
      }
      onCancel={row ? undefined : routes.cancel}
      actions={row ? <RowActions jobId={jobId} row={row} onDeleted={routes.gone} /> : undefined}
    />
  );
}

type RowActionsProps = { jobId: string; row: SpecificationRow; onDeleted: () => void };

function RowActions({ jobId, row, onDeleted }: RowActionsProps) {
  const { remove } = useSpecificationActions(jobId);
  return (
    <>
      <LinkButton href={`/jobs/${jobId}/specification/new?from=${row.id}`} label="Copy to a new one" />
      <DeleteButton
        noun="row"
        name={`row ${row.label}`}
        consequence="Runs that it covers then take another row, or the thickness that the study proposes."
        onDelete={() => remove(row)}
        onDeleted={onDeleted}
      />
    </>
  );
}
