import type { ReactNode } from 'react';
import { FormProvider } from 'react-hook-form';

import { buildUpSchema, type BuildUp } from '@/api/contracts/build-up';
import { RowForm } from '@/components/forms/row-form';
import { useRowForm } from '@/components/forms/use-row-form';
import { useBuildUpActions } from '@/hooks/use-build-ups';

import { blankCovering, buildUpDraftSchema } from './covering-draft';
import { CoveringFields, type CoveringChoices } from './covering-fields';
import { coveringFacts } from './covering-words';

type BuildUpFormProps = {
  jobId: string;
  /** null: a new one */
  buildUp: BuildUp | null;
  /** what a new one begins with */
  copyOf?: BuildUp;
  choices: CoveringChoices;
  onSaved: (buildUp: BuildUp) => void;
  onCancel?: () => void;
  actions?: ReactNode;
};

export function BuildUpForm({ jobId, buildUp, copyOf, choices, onSaved, onCancel, actions }: BuildUpFormProps) {
  const editing = useRowForm({
    schema: buildUpDraftSchema,
    rowSchema: buildUpSchema,
    row: buildUp,
    initial: buildUp ?? copyOf ?? blankCovering,
    actions: useBuildUpActions(jobId),
    onSaved,
  });
  return (
    <FormProvider {...editing.form}>
      <RowForm
        editing={editing}
        label="Build-up"
        saveLabel="Save the build-up"
        factsOf={(values) => coveringFacts(values, choices.names)}
        onCancel={onCancel}
        actions={actions}
      >
        <CoveringFields {...choices} isOutermostOpen />
      </RowForm>
    </FormProvider>
  );
}
