import { useWatch, type UseFormReturn } from 'react-hook-form';

import type { JobInput } from '@/api/contracts/job';
import { FormSelect } from '@/components/forms/form-select';
import { FormTextField } from '@/components/forms/form-text-field';
import { Checkbox } from '@/components/ui/checkbox';
import { Grid, Stack } from '@/components/ui/stack';

type DueFieldsProps = { form: UseFormReturn<JobInput>; timeZone: string };

/** Day and hour as the client's clock shows them, and where that clock hangs. */
export function DueFields({ form: { control, setValue }, timeZone }: DueFieldsProps) {
  const bidDue = useWatch({ control, name: 'bidDue' });
  const set = (isSet: boolean) =>
    setValue('bidDue', isSet ? { date: '', time: '14:00', zone: timeZone } : null, { shouldDirty: true });
  return (
    <Stack gap="xs" role="group" aria-label="Bid due">
      <Checkbox label="The bid has a due date" checked={bidDue !== null} onChange={set} />
      {bidDue ? (
        <Grid column={160} gap="sm">
          <FormTextField control={control} name="bidDue.date" label="Day" kind="date" />
          <FormTextField control={control} name="bidDue.time" label="Time" kind="time" />
          <FormSelect control={control} name="bidDue.zone" label="On the clock of" options={zoneOptions(bidDue.zone)} />
        </Grid>
      ) : null}
    </Stack>
  );
}

/** Every zone that the browser knows, by continent; the one in use even where it does not. */
function zoneOptions(current: string) {
  const known = Intl.supportedValuesOf('timeZone');
  const zones = known.includes(current) ? known : [current, ...known];
  return zones.map((zone) => {
    const [continent, ...place] = zone.split('/');
    return {
      value: zone,
      label: place.join(', ').replaceAll('_', ' ') || zone,
      group: place.length > 0 ? continent : undefined,
    };
  });
}
