import type { LibraryFinish } from '@/api/contracts/library';
import { useFinishes } from '@/hooks/use-library';

import { DepartureDialog } from './departure-dialog';
import { finishChoice } from './override';
import type { Deciding } from './choices';
import { useDepartures } from './use-departures';

type FinishDialogProps = Deciding & { onClose: () => void };

/** Bright metal keeps heat in and the surface hot; paint the other way about: the study follows at once. */
export function FinishDialog({ jobId, run, runStudy: { assembly }, row, onClose }: FinishDialogProps) {
  const { data: finishes = [] } = useFinishes();
  const depart = useDepartures(jobId);
  const options = finishes.filter(({ bare }) => !bare).map(optionOf);
  const current = { value: assembly.finishId, label: assembly.finishName };
  return (
    <DepartureDialog
      run={run}
      title="Change the finish"
      initial={{ reason: run.override?.reason ?? '', finishId: assembly.finishId }}
      finishes={options.some(({ value }) => value === current.value) ? options : [current, ...options]}
      change={({ finishId }) => ({ finishId: finishChoice(finishId, row) })}
      onSave={(override) => depart(run, override, `The finish of ${run.number} is changed.`)}
      onClose={onClose}
    >
      {`Now ${assembly.finishName}. The emittance as new decides touch and dew point, the aged one heat flow.`}
    </DepartureDialog>
  );
}

const optionOf = ({ id, name, emittanceNew, emittanceAged }: LibraryFinish) => ({
  value: id,
  label: `${name} (${emittanceNew.toFixed(2)} new, ${emittanceAged.toFixed(2)} aged)`,
});
