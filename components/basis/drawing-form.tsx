import { drawingInputSchema, drawingSchema, type Drawing, type DrawingInput } from '@/api/contracts/basis';
import { FormTextField } from '@/components/forms/form-text-field';
import { RowForm } from '@/components/forms/row-form';
import { useRowForm } from '@/components/forms/use-row-form';
import { dateText } from '@/components/job/due-words';
import { Grid } from '@/components/ui/stack';
import { useDrawingActions } from '@/hooks/use-basis';

import type { BasisFormProps } from './level-form';

const blankDrawing: DrawingInput = { number: '', title: '', revision: '', date: null, scale: '' };

export function DrawingForm({ jobId, row, onSaved, onCancel, actions }: Omit<BasisFormProps<Drawing>, 'next'>) {
  const editing = useRowForm({
    schema: drawingInputSchema,
    rowSchema: drawingSchema,
    row,
    initial: row ?? blankDrawing,
    actions: useDrawingActions(jobId),
    onSaved,
  });
  const { control } = editing.form;
  return (
    <RowForm
      editing={editing}
      label="Drawing"
      saveLabel="Save the drawing"
      factsOf={drawingFacts}
      onCancel={onCancel}
      actions={actions}
    >
      <Grid column={200}>
        <FormTextField control={control} name="number" label="Number" />
        <FormTextField control={control} name="title" label="Title" optional />
        <FormTextField control={control} name="revision" label="Revision" optional />
        <FormTextField control={control} name="date" label="Date of issue" kind="date" blank={null} optional />
        <FormTextField
          control={control}
          name="scale"
          label="Scale as printed"
          optional
          hint="Half-size plots happen every day: check it on a known length"
        />
      </Grid>
    </RowForm>
  );
}

export const drawingFacts = ({ number, title, revision, date, scale }: DrawingInput) => [
  { term: 'Number', value: number },
  { term: 'Title', value: title },
  { term: 'Revision', value: revision },
  { term: 'Date of issue', value: date ? dateText(date) : '' },
  { term: 'Scale as printed', value: scale },
];
