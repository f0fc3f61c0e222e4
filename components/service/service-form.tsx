import type { ReactNode } from 'react';

import { serviceInputSchema, serviceSchema, type Service } from '@/api/contracts/service';
import { FormNumberField } from '@/components/forms/form-number-field';
import { FormQuantityField } from '@/components/forms/form-quantity-field';
import { FormTextField } from '@/components/forms/form-text-field';
import { RowForm } from '@/components/forms/row-form';
import { useRowForm } from '@/components/forms/use-row-form';
import { Notice } from '@/components/ui/notice';
import { Grid } from '@/components/ui/stack';
import { useServiceActions } from '@/hooks/use-services';
import { useUnits } from '@/hooks/use-units';

import { blankService } from './blank-service';
import { LimitFields } from './limit-fields';
import { serviceFacts } from './service-facts';
import { StateFields } from './state-fields';

type ServiceFormProps = {
  jobId: string;
  /** null: a new one */
  service: Service | null;
  /** what a new one begins with */
  copyOf?: Service;
  /** where a new one stands in the schedule */
  position: number;
  places: readonly { id: string; name: string }[];
  onSaved: (service: Service) => void;
  onCancel?: () => void;
  actions?: ReactNode;
};

export function ServiceForm(props: ServiceFormProps) {
  const { jobId, service, copyOf, position, places, onSaved, onCancel, actions } = props;
  const { units } = useUnits();
  const editing = useRowForm({
    schema: serviceInputSchema,
    rowSchema: serviceSchema,
    row: service,
    initial: service ?? (copyOf ? { ...copyOf, name: '', position } : blankService(position)),
    actions: useServiceActions(jobId),
    onSaved,
  });
  const { form } = editing;
  const { control } = form;
  return (
    <RowForm
      editing={editing}
      label="Service"
      saveLabel="Save the service"
      factsOf={(values) => serviceFacts(values, { units, places })}
      onCancel={onCancel}
      actions={actions}
    >
      <Grid column={320}>
        <FormTextField control={control} name="name" label="Name" hint="As the specification calls it" />
        <FormTextField
          control={control}
          name="fluid"
          label="What is in it"
          hint="Water, steam, air, refrigerant vapour"
        />
      </Grid>
      <StateFields form={form} />
      <Notice tone="note">
        Hot and cold drinking water: enter the temperatures of the water-safety plan, never others for the insulation’s
        sake.
      </Notice>
      <LimitFields form={form} places={places} />
      <Grid column={180}>
        <FormQuantityField control={control} name="hours" label="Hours a year" kind="hours" hint="8760 is all year" />
        <FormNumberField control={control} name="position" label="Place in the schedule" whole />
      </Grid>
      <FormTextField control={control} name="note" label="Note" optional hint="Printed with the service" />
    </RowForm>
  );
}
