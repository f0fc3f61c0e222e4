import { addendumInputSchema, addendumSchema, type Addendum, type AddendumInput } from '@/api/contracts/basis';
import { FormCheckbox } from '@/components/forms/form-checkbox';
import { FormNumberField } from '@/components/forms/form-number-field';
import { FormTextField } from '@/components/forms/form-text-field';
import { RowForm } from '@/components/forms/row-form';
import { useRowForm } from '@/components/forms/use-row-form';
import { dateText } from '@/components/job/due-words';
import { Grid } from '@/components/ui/stack';
import { useAddendumActions } from '@/hooks/use-basis';

import type { BasisFormProps } from './level-form';

export function AddendumForm({ jobId, row, next, onSaved, onCancel, actions }: BasisFormProps<Addendum>) {
  const editing = useRowForm({
    schema: addendumInputSchema,
    rowSchema: addendumSchema,
    row,
    initial: row ?? { number: next, date: '', changes: '', acknowledged: false },
    actions: useAddendumActions(jobId),
    onSaved,
  });
  const { control } = editing.form;
  return (
    <RowForm
      editing={editing}
      label="Addendum"
      saveLabel="Save the addendum"
      factsOf={addendumFacts}
      onCancel={onCancel}
      actions={actions}
    >
      <Grid column={200}>
        <FormNumberField control={control} name="number" label="Number" whole />
        <FormTextField control={control} name="date" label="Date" kind="date" />
      </Grid>
      <FormTextField
        control={control}
        name="changes"
        label="What it changes"
        hint="One change on each line"
        multiline={5}
        optional
      />
      <FormCheckbox
        control={control}
        name="acknowledged"
        label="Acknowledged"
        hint="Its changes are in the takeoff, and the document says so."
      />
    </RowForm>
  );
}

export const addendumFacts = ({ number, date, changes, acknowledged }: AddendumInput) => [
  { term: 'Number', value: String(number) },
  { term: 'Date', value: dateText(date) },
  { term: 'What it changes', value: changes },
  { term: 'Acknowledged', value: acknowledged ? 'yes' : 'no' },
];
