import { useWatch } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';

import type { LibraryPipeSize } from '@/api/contracts/library';
import { FormQuantityField } from '@/components/forms/form-quantity-field';
import { FormSelect } from '@/components/forms/form-select';
import { useFieldUnits } from '@/components/forms/field-units';
import { showWithUnit, type UnitSystem } from '@/api/contracts/quantities';
import { space } from '@/components/theme/tokens';

import type { RunFormFields } from './run-entry-field';
import type { RunLookups } from './run-row';

type RunSizeFieldProps = { form: RunFormFields; lookups: RunLookups };

/** A size is a standard and a nominal; a free diameter only under "other". */
export function RunSizeField({ form, lookups: { pipeSizes } }: RunSizeFieldProps) {
  const { control, setValue } = form;
  const units = useFieldUnits();
  const standard = useWatch({ control, name: 'shape.size.standard' });
  const emptySize = () => setValue('shape.size.nominal', '', { shouldDirty: true });
  const ofStandard = pipeSizes.filter((size) => size.standard === standard);
  return (
    <View style={styles.both}>
      <View style={styles.one}>
        <FormSelect
          control={control}
          name="shape.size.standard"
          label="Pipe"
          options={standardsOf(pipeSizes)}
          onChosen={emptySize}
        />
      </View>
      <View style={styles.one}>
        {standard === 'other' ? (
          <FormQuantityField
            control={control}
            name="shape.size.outsideDiameter"
            label="Outside diameter"
            kind="dimension"
          />
        ) : (
          <FormSelect
            control={control}
            name="shape.size.nominal"
            label="Size"
            options={ofStandard.map((size) => ({ value: size.nominal, label: sizeLabel(size, units) }))}
          />
        )}
      </View>
    </View>
  );
}

function standardsOf(sizes: readonly LibraryPipeSize[]) {
  const titles = new Map(sizes.map(({ standard, standardTitle }) => [standard, standardTitle]));
  return [
    ...[...titles].map(([value, label]) => ({ value, label })),
    { value: 'other', label: 'Other, by its diameter' },
  ];
}

/** "DN 100 · NPS 4 · 114.3 mm": nominal is not diameter, so both stand there. */
function sizeLabel({ dn, nominal, outsideDiameter }: LibraryPipeSize, units: UnitSystem): string {
  const outside = showWithUnit('dimension', outsideDiameter, { units, digits: units === 'SI' ? 1 : 3 });
  const named =
    dn === null || nominal.includes(`DN ${dn}`)
      ? [nominal]
      : units === 'SI'
        ? [`DN ${dn}`, nominal]
        : [nominal, `DN ${dn}`];
  return [...named, outside].join(' · ');
}

const styles = StyleSheet.create({
  both: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
  one: { flexGrow: 1, flexShrink: 1, flexBasis: 180, minWidth: 0 },
});
