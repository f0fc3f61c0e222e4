import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';

import { overrideSchema, type Override, type Run } from '@/api/contracts/run';
import { FormDialog } from '@/components/forms/form-dialog';
import { FormSelect } from '@/components/forms/form-select';
import { FormTextField } from '@/components/forms/form-text-field';
import { plainResolver } from '@/components/forms/plain-resolver';
import { problemOf } from '@/components/forms/show-problem';
import type { Option } from '@/components/ui/select';
import { Notice } from '@/components/ui/notice';
import { Text } from '@/components/ui/text';

import { departure } from './override';

const schema = z.object({ reason: overrideSchema.shape.reason, finishId: z.string() });
type Departure = z.infer<typeof schema>;

type DepartureDialogProps = {
  run: Run;
  /** "Use 114 mm" */
  title: string;
  /** what it departs from */
  children: string;
  initial: Departure;
  /** given where the finish is what changes */
  finishes?: readonly Option[];
  change: (typed: Departure) => Partial<Override>;
  /** writes; it has to be with the run as it is now */
  onSave: (override: Override) => Promise<unknown>;
  onClose: () => void;
};

/** A departure from the specification is kept and printed with its reason. */
export function DepartureDialog({ run, title, children, initial, finishes, change, ...does }: DepartureDialogProps) {
  const { onSave, onClose } = does;
  const form = useForm<Departure, unknown, Departure>({ resolver: plainResolver(schema), defaultValues: initial });
  const [isStale, setStale] = useState(false);
  const save = async (typed: Departure) => {
    try {
      await onSave(departure(run, { ...change(typed), reason: typed.reason }));
      onClose();
    } catch (error) {
      setStale(problemOf(error)?.type === '/problems/stale');
      throw error;
    }
  };
  return (
    <FormDialog title={title} saveLabel={title} width="narrow" form={form} onSave={save} onClose={onClose}>
      <Text>{children}</Text>
      {isStale ? <TheirsNotice run={run} /> : null}
      {finishes ? (
        <FormSelect
          control={form.control}
          name="finishId"
          label="Finish for this run, with its emittance"
          options={finishes}
        />
      ) : null}
      <FormTextField
        control={form.control}
        name="reason"
        label="Reason"
        hint="It is printed in the document beside this run."
        multiline={3}
        maxLength={400}
      />
    </FormDialog>
  );
}

/** Behind the dialog stands what the other one made of the run; what was typed here is still here. */
function TheirsNotice({ run }: { run: Run }) {
  const said = run.override ? ` Their reason: “${run.override.reason}”.` : ' It is as specified now.';
  return (
    <Notice title={`Someone else changed ${run.number} meanwhile`} urgent>
      {`The study behind this shows theirs.${said} What you typed is kept: save again to put yours in its place, or close this to leave theirs.`}
    </Notice>
  );
}
