import { useWatch } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';

import { ductFittings, pipeFittings } from '@/api/contracts/run';
import { fittingWords } from '@/api/contracts/run-words';
import { FormNumberField } from '@/components/forms/form-number-field';
import { space } from '@/components/theme/tokens';
import { Text } from '@/components/ui/text';

import type { RunFormFields } from './run-entry-field';

/** Raw counts by kind; what is left empty is none. */
export function RunFittingsField({ form }: { form: RunFormFields }) {
  const kind = useWatch({ control: form.control, name: 'shape.kind' });
  const kinds = kind === 'pipe' ? pipeFittings : ductFittings;
  return (
    <View role="group" aria-label="Fittings" style={styles.group}>
      <Text weight="strong">Fittings, counted</Text>
      <View style={styles.counts}>
        {kinds.map((fitting) => (
          <View key={fitting} style={styles.count}>
            <FormNumberField
              control={form.control}
              name={`fittings.${fitting}`}
              label={capital(fittingWords[fitting][1])}
              whole
            />
          </View>
        ))}
      </View>
    </View>
  );
}

const capital = (text: string) => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;

const styles = StyleSheet.create({
  group: { gap: space.xs },
  counts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
  count: { width: 116 },
});
