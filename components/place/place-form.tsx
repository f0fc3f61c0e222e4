import type { ReactNode } from 'react';
import { useWatch } from 'react-hook-form';

import { placeInputSchema, placeSchema, type Place } from '@/api/contracts/place';
import { FormCheckbox } from '@/components/forms/form-checkbox';
import { FormSelect } from '@/components/forms/form-select';
import { FormTextField } from '@/components/forms/form-text-field';
import { RowForm } from '@/components/forms/row-form';
import { useRowForm } from '@/components/forms/use-row-form';
import { Grid, Row, Stack } from '@/components/ui/stack';
import { usePlaceActions } from '@/hooks/use-places';
import { useUnits } from '@/hooks/use-units';

import { blankPlace } from './blank-place';
import { ConditionFields } from './condition-fields';
import { placeFacts } from './place-facts';
import { TouchFields } from './touch-fields';

type PlaceFormProps = {
  jobId: string;
  /** null: a new one */
  place: Place | null;
  /** what a new one begins with */
  copyOf?: Place;
  ductLocations: readonly { id: string; words: string }[];
  onSaved: (place: Place) => void;
  onCancel?: () => void;
  actions?: ReactNode;
};

export function PlaceForm({ jobId, place, copyOf, ductLocations, onSaved, onCancel, actions }: PlaceFormProps) {
  const { units } = useUnits();
  const editing = useRowForm({
    schema: placeInputSchema,
    rowSchema: placeSchema,
    row: place,
    initial: place ?? (copyOf ? { ...copyOf, name: '' } : blankPlace),
    actions: usePlaceActions(jobId),
    onSaved,
  });
  const { form } = editing;
  const { control } = form;
  const outdoor = useWatch({ control, name: 'outdoor' });
  return (
    <RowForm
      editing={editing}
      label="Place"
      saveLabel="Save the place"
      factsOf={(values) => placeFacts(values, { units, ductLocations })}
      onCancel={onCancel}
      actions={actions}
    >
      <FormTextField control={control} name="name" label="Name" hint="As the drawings and the crew call it" />
      <Row gap="lg">
        <FormCheckbox control={control} name="outdoor" label="Outdoors" />
        <FormCheckbox control={control} name="plenum" label="Return-air plenum" />
      </Row>
      <TouchFields form={form} />
      <ConditionFields form={form} />
      <Stack gap="sm">
        <Grid column={320}>
          <FormSelect
            control={control}
            name="ductLocation"
            label="Ducts here, for the energy code"
            none="No duct runs here, or the table does not apply"
            options={ductLocations.map(({ id, words }) => ({ value: id, label: words }))}
            hint={outdoor ? 'Sun and clear night sky are not counted.' : undefined}
          />
          <FormTextField control={control} name="note" label="Note" optional hint="Printed with the place" />
        </Grid>
      </Stack>
    </RowForm>
  );
}
