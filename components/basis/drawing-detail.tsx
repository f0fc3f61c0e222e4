import type { Drawing } from '@/api/contracts/basis';
import { DeleteButton } from '@/components/job/delete-button';
import { useRowRoutes } from '@/components/job/use-row-routes';
import { useUses } from '@/components/job/use-uses';
import { FactList } from '@/components/ui/fact-list';
import { useDrawingActions } from '@/hooks/use-basis';
import { useMay } from '@/hooks/use-session';

import { DrawingForm, drawingFacts } from './drawing-form';

/** A drawing to change, for who may; to read, for everyone else. */
export function DrawingDetail({ jobId, drawing }: { jobId: string; drawing: Drawing | null }) {
  const mayEdit = useMay('edit-jobs');
  const routes = useRowRoutes({ list: `/jobs/${jobId}/drawings`, one: (id) => `/jobs/${jobId}/drawings/${id}` });
  if (drawing && !mayEdit) return <FactList facts={drawingFacts(drawing).filter(({ value }) => value)} />;
  return (
    <DrawingForm
      jobId={jobId}
      row={drawing}
      onSaved={({ id, number }) =>
        drawing ? routes.changed(`${number} is saved.`) : routes.created(id, `${number} is added.`)
      }
      onCancel={drawing ? undefined : routes.cancel}
      actions={drawing ? <DrawingActions jobId={jobId} drawing={drawing} onDeleted={routes.gone} /> : undefined}
    />
  );
}

type DrawingActionsProps = { jobId: string; drawing: Drawing; onDeleted: () => void };

function DrawingActions({ jobId, drawing, onDeleted }: DrawingActionsProps) {
  const { remove } = useDrawingActions(jobId);
  const uses = useUses(jobId, { by: 'drawingId', id: drawing.id });
  return (
    <DeleteButton
      noun="drawing"
      name={drawing.number}
      uses={uses}
      onDelete={() => remove(drawing)}
      onDeleted={onDeleted}
    />
  );
}
