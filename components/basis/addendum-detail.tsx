import type { Addendum } from '@/api/contracts/basis';
import { DeleteButton } from '@/components/job/delete-button';
import { useRowRoutes } from '@/components/job/use-row-routes';
import { FactList } from '@/components/ui/fact-list';
import { Loading } from '@/components/ui/loading';
import { useAddendumActions, useBasis } from '@/hooks/use-basis';
import { useMay } from '@/hooks/use-session';

import { AddendumForm, addendumFacts } from './addendum-form';

/** An addendum to change, for who may; to read, for everyone else. */
export function AddendumDetail({ jobId, addendum }: { jobId: string; addendum: Addendum | null }) {
  const mayEdit = useMay('edit-jobs');
  const { addenda } = useBasis(jobId);
  const { remove } = useAddendumActions(jobId);
  const routes = useRowRoutes({ list: `/jobs/${jobId}/addenda`, one: (id) => `/jobs/${jobId}/addenda/${id}` });
  if (!addenda) return <Loading label="Addendum" shape="form" />;
  if (addendum && !mayEdit) return <FactList facts={addendumFacts(addendum)} />;
  const titleOf = ({ number }: Addendum) => `Addendum ${number}`;
  return (
    <AddendumForm
      jobId={jobId}
      row={addendum}
      next={Math.min(999, Math.max(0, ...addenda.map(({ number }) => number)) + 1)}
      onSaved={(saved) =>
        addendum
          ? routes.changed(`${titleOf(saved)} is saved.`)
          : routes.created(saved.id, `${titleOf(saved)} is added.`)
      }
      onCancel={addendum ? undefined : routes.cancel}
      actions={
        addendum ? (
          <DeleteButton
            noun="addendum"
            name={titleOf(addendum)}
            onDelete={() => remove(addendum)}
            onDeleted={routes.gone}
          />
        ) : undefined
      }
    />
  );
}
