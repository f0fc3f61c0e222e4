import type { ReactNode } from 'react';

import { levelInputSchema, levelSchema, type Level, type LevelInput } from '@/api/contracts/basis';
import { FormNumberField } from '@/components/forms/form-number-field';
import { FormTextField } from '@/components/forms/form-text-field';
import { RowForm } from '@/components/forms/row-form';
import { useRowForm } from '@/components/forms/use-row-form';
import { Grid } from '@/components/ui/stack';
import { useLevelActions } from '@/hooks/use-basis';

export type BasisFormProps<Row> = {
  jobId: string;
  /** null: a new one */
  row: Row | null;
  /** the number of a new one */
  next: number;
  onSaved: (row: Row) => void;
  onCancel?: () => void;
  actions?: ReactNode;
};

export function LevelForm({ jobId, row, next, onSaved, onCancel, actions }: BasisFormProps<Level>) {
  const editing = useRowForm({
    schema: levelInputSchema,
    rowSchema: levelSchema,
    row,
    initial: row ?? { name: '', position: next },
    actions: useLevelActions(jobId),
    onSaved,
  });
  const { control } = editing.form;
  return (
    <RowForm
      editing={editing}
      label="Level"
      saveLabel="Save the level"
      factsOf={levelFacts}
      onCancel={onCancel}
      actions={actions}
    >
      <Grid column={240}>
        <FormTextField control={control} name="name" label="Name" hint="A floor, a roof, a tunnel, an area" />
        <FormNumberField
          control={control}
          name="position"
          label="Order"
          whole
          hint="Levels stand in this order everywhere"
        />
      </Grid>
    </RowForm>
  );
}

export const levelFacts = ({ name, position }: LevelInput) => [
  { term: 'Name', value: name },
  { term: 'Order', value: String(position) },
];
