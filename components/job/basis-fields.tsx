import type { UseFormReturn } from 'react-hook-form';

import type { JobInput } from '@/api/contracts/job';
import type { LibraryCode } from '@/api/contracts/library';
import { FormQuantityField } from '@/components/forms/form-quantity-field';
import { FormSegmented } from '@/components/forms/form-segmented';
import { FormSelect } from '@/components/forms/form-select';
import { Heading } from '@/components/ui/heading';
import { Grid, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { methodWords, seriesWords } from './job-facts';

type BasisFieldsProps = Pick<UseFormReturn<JobInput>, 'control'> & { codes: readonly LibraryCode[] };

// the thermal zones of ASHRAE 169
const zones = '0A 0B 1A 1B 2A 2B 3A 3B 3C 4A 4B 4C 5A 5B 5C 6A 6B 7 8'.split(' ');
const choices = (words: Record<string, string>) => Object.entries(words).map(([value, label]) => ({ value, label }));

/** What every run of the job is judged by. */
export function BasisFields({ control, codes }: BasisFieldsProps) {
  return (
    <Stack gap="sm">
      <Heading>What its runs are judged by</Heading>
      <Grid column={180}>
        <FormSelect
          control={control}
          name="codeEdition"
          label="Energy code"
          options={codes.map(({ id, title }) => ({ value: id, label: title }))}
          hint="As adopted where the job is"
        />
        <FormSelect
          control={control}
          name="climateZone"
          label="Climate zone"
          placeholder="Choose a zone"
          options={zones.map((zone) => ({ value: zone, label: zone }))}
          hint="Ducts are judged by it"
        />
        <FormQuantityField
          control={control}
          name="altitude"
          label="Above sea level"
          kind="altitude"
          hint="Thin air cools less"
        />
        <FormSelect control={control} name="currency" label="Currency" options={currencies()} />
      </Grid>
      <Grid column={240}>
        <FormSegmented
          control={control}
          name="seriesUnit"
          label="Thicknesses on offer"
          segments={choices(seriesWords)}
          hint="Which made series the study offers where none is specified"
        />
        <FormSegmented
          control={control}
          name="surfaceMethod"
          label="Heat given off at the surface"
          segments={choices(methodWords)}
        />
      </Grid>
      <Text size="small" tone="inkSoft">
        The tables are entered from their sources: verify them against the edition that is adopted.
      </Text>
    </Stack>
  );
}

function currencies() {
  const names = new Intl.DisplayNames('en', { type: 'currency' });
  return Intl.supportedValuesOf('currency').map((code) => ({
    value: code,
    label: `${code}, ${names.of(code) ?? code}`,
  }));
}
