import type { ReactNode } from 'react';
import { FormProvider } from 'react-hook-form';

import { specificationRowSchema, type SpecificationRow } from '@/api/contracts/build-up';
import { specificationDraftSchema, blankCovering } from '@/components/build-up/covering-draft';
import { CoveringFields, type CoveringChoices } from '@/components/build-up/covering-fields';
import { coveringFacts } from '@/components/build-up/covering-words';
import { FormTextField } from '@/components/forms/form-text-field';
import { RowForm } from '@/components/forms/row-form';
import { useRowForm } from '@/components/forms/use-row-form';
import { Grid } from '@/components/ui/stack';
import { useSpecificationActions } from '@/hooks/use-specification';

type SpecificationFormProps = {
  jobId: string;
  /** null: a new one */
  row: SpecificationRow | null;
  /** what a new one begins with */
  copyOf?: SpecificationRow;
  /** what a new one is called */
  label: string;
  choices: CoveringChoices;
  onSaved: (row: SpecificationRow) => void;
  onCancel?: () => void;
  actions?: ReactNode;
};

export function SpecificationForm(props: SpecificationFormProps) {
  const { jobId, row, copyOf, label, choices, onSaved, onCancel, actions } = props;
  const editing = useRowForm({
    schema: specificationDraftSchema,
    rowSchema: specificationRowSchema,
    row,
    initial: row ?? { ...(copyOf ?? blankCovering), label },
    actions: useSpecificationActions(jobId),
    onSaved,
  });
  return (
    <FormProvider {...editing.form}>
      <RowForm
        editing={editing}
        label="Specification row"
        saveLabel="Save the row"
        factsOf={(values) => [{ term: 'Row', value: values.label }, ...coveringFacts(values, choices.names)]}
        onCancel={onCancel}
        actions={actions}
      >
        <Grid column={320}>
          <FormTextField
            control={editing.form.control}
            name="label"
            label="Row"
            hint="Its number or letter in the table as handed down"
          />
        </Grid>
        <CoveringFields {...choices} isOutermostOpen={false} />
      </RowForm>
    </FormProvider>
  );
}
