import { useFieldArray, useWatch, type UseFormReturn } from 'react-hook-form';

import type { ServiceInput } from '@/api/contracts/service';
import { FormQuantityField } from '@/components/forms/form-quantity-field';
import { Segmented } from '@/components/ui/segmented';
import { Grid, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { areUsual, natureOf, statesAs, usualLimits, type Nature } from './blank-service';

type StateFieldsProps = { form: UseFormReturn<ServiceInput> };

const segments: readonly { value: Nature; label: string }[] = [
  { value: 'hot', label: 'Hot' },
  { value: 'cold', label: 'Cold' },
  { value: 'both', label: 'Hot and cold in turn' },
];

/** What the fluid does: warmer than the air, colder, or one after the other; three temperatures for each. */
export function StateFields({ form }: StateFieldsProps) {
  const { control, getValues, setValue } = form;
  const { fields, replace } = useFieldArray({ control, name: 'states' });
  const states = useWatch({ control, name: 'states' });
  const nature = natureOf(states);
  const choose = (chosen: Nature) => {
    const limits = getValues('limits');
    if (areUsual(limits, nature)) setValue('limits', usualLimits(chosen), { shouldDirty: true });
    replace(statesAs(chosen, getValues('states')));
  };
  return (
    <Stack gap="sm">
      <Segmented label="The fluid is" value={nature} segments={segments} onChange={choose} />
      {fields.map(({ id }, index) => (
        <Stack key={id} gap="xs" role="group" aria-label={stateTitle(states[index]?.nature, nature)}>
          {nature === 'both' ? <Text weight="strong">{stateTitle(states[index]?.nature, nature)}</Text> : null}
          <Grid column={104} gap="sm">
            {temperatures.map(({ part, label, hint }) => (
              <FormQuantityField
                key={part}
                control={control}
                name={`states.${index}.${part}`}
                label={label}
                hint={hint}
                kind="temperature"
              />
            ))}
          </Grid>
        </Stack>
      ))}
    </Stack>
  );
}

const temperatures = [
  { part: 'operating', label: 'Operating', hint: 'Energy code, heat flow' },
  { part: 'lowest', label: 'Lowest', hint: 'Dew point, material' },
  { part: 'highest', label: 'Highest', hint: 'Touch, material' },
] as const;

const stateTitle = (state: 'hot' | 'cold' | undefined, nature: Nature): string => {
  if (nature !== 'both') return 'Temperatures';
  return state === 'cold' ? 'While it is cold' : 'While it is hot';
};
