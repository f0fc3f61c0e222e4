import { useEffect } from 'react';
import { useWatch } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';

import { FormTextField } from '@/components/forms/form-text-field';
import { space } from '@/components/theme/tokens';

import type { RunFormFields } from './run-entry-field';

/** A run on hold names the reason and who placed it; any other has none. */
export function RunHoldField({ form }: { form: RunFormFields }) {
  const { control, getValues, setValue } = form;
  const status = useWatch({ control, name: 'status' });
  const isHeld = status === 'on-hold';
  useEffect(() => {
    const hold = getValues('hold');
    if (isHeld && !hold) setValue('hold', { reason: '', by: '' });
    if (!isHeld && hold) setValue('hold', null);
  }, [isHeld, getValues, setValue]);
  if (!isHeld) return null;
  return (
    <View style={styles.hold}>
      <FormTextField
        control={control}
        name="hold.reason"
        label="Why it is on hold"
        hint="Suspect lagging: stop, do not disturb it, have it tested."
        multiline={2}
      />
      <FormTextField control={control} name="hold.by" label="Placed by" />
    </View>
  );
}

const styles = StyleSheet.create({ hold: { gap: space.sm } });
