import { useUnits } from '@/hooks/use-units';

import { candidateName } from './candidate-words';
import type { Deciding } from './choices';
import { DepartureDialog } from './departure-dialog';
import { layersAt } from './override';
import { useDepartures } from './use-departures';

type ThicknessDialogProps = { of: Deciding; place: number; title: string; onClose: () => void };

/** A thickness that departs from the specification, with the reason for it. */
export function ThicknessDialog({ of: { jobId, run, runStudy, row }, place, title, onClose }: ThicknessDialogProps) {
  const { units } = useUnits();
  const depart = useDepartures(jobId);
  const candidate = runStudy.study.candidates[place];
  if (!candidate) return null;
  const layers = layersAt(runStudy, candidate, run.override?.layers ?? row?.layers);
  const handedDown = row && candidateName({ names: row.layers.flatMap(({ thickness }) => thickness ?? []) }, units);
  return (
    <DepartureDialog
      run={run}
      title={title}
      initial={{ reason: place === runStudy.used ? (run.override?.reason ?? '') : '', finishId: '' }}
      change={() => ({ layers })}
      onSave={(override) => depart(run, override, `${run.number} is at ${candidateName(candidate, units)}.`)}
      onClose={onClose}
    >
      {row
        ? `The specification (${row.label}) has ${handedDown} here. What departs from it is kept and printed with its reason.`
        : 'What is chosen instead of the proposed thickness is kept and printed with its reason.'}
    </DepartureDialog>
  );
}
