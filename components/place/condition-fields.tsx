import type { UseFormReturn } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';

import type { PlaceInput } from '@/api/contracts/place';
import { FormQuantityField } from '@/components/forms/form-quantity-field';
import { FormTextField } from '@/components/forms/form-text-field';
import { hairline, space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Button } from '@/components/ui/button';
import { Heading } from '@/components/ui/heading';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { DewPointLine } from './dew-point-line';
import { conditionSetWords } from './place-words';

type ConditionFieldsProps = { form: UseFormReturn<PlaceInput> };
type SetWords = (typeof conditionSetWords)[number];

/** The five condition sets under each other, so that a slip shows against its neighbours. */
export function ConditionFields({ form }: ConditionFieldsProps) {
  const { isPhone } = useLayout();
  const { getValues, setValue } = form;
  const copySource = () => {
    const source = getValues('conditions.hottest.source');
    conditionSetWords.forEach(({ name }) => {
      if (getValues(`conditions.${name}.source`) === '') {
        setValue(`conditions.${name}.source`, source, { shouldDirty: true, shouldValidate: true });
      }
    });
  };
  return (
    <Stack gap="xs">
      <Heading>The air here</Heading>
      <Text tone="inkSoft">
        Hottest and most humid air is judged still: wind is never counted where it would flatter a surface.
      </Text>
      <View role="group" aria-label="The air here">
        {isPhone ? null : <Head />}
        {conditionSetWords.map((set) => (
          <SetFields key={set.name} set={set} form={form} isPhone={isPhone} />
        ))}
      </View>
      <View style={styles.start}>
        <Button label="Put the first source where none is given" onPress={copySource} />
      </View>
    </Stack>
  );
}

function Head() {
  return (
    <View style={styles.row} aria-hidden>
      {['', 'Air', 'Humidity', 'Wind', 'Source'].map((label) => (
        <Text key={label} size="small" tone="inkSoft" weight="strong" align={label === 'Source' ? 'left' : 'right'}>
          {label}
        </Text>
      ))}
    </View>
  );
}

type SetFieldsProps = ConditionFieldsProps & { set: SetWords; isPhone: boolean };

function SetFields({ set, form: { control }, isPhone }: SetFieldsProps) {
  const theme = useTheme();
  const { name, title, decides, isStill } = set;
  const label = (part: string) => `${title}: ${part}`;
  return (
    <View style={[isPhone ? styles.stack : styles.row, { borderTopColor: theme.rule }, styles.line]}>
      <View style={isPhone ? styles.whole : styles.title}>
        <Text weight="strong">{title}</Text>
        {name === 'mostHumid' ? (
          <DewPointLine control={control} />
        ) : (
          <Text size="small" tone="inkSoft">
            {decides}
          </Text>
        )}
      </View>
      <FormQuantityField
        control={control}
        name={`conditions.${name}.air`}
        label={label('air')}
        hideLabel={!isPhone}
        kind="temperature"
      />
      {name === 'mostHumid' ? (
        <FormQuantityField
          control={control}
          name="conditions.mostHumid.humidity"
          label={label('humidity')}
          hideLabel={!isPhone}
          kind="humidity"
        />
      ) : isPhone ? null : (
        <View />
      )}
      {isStill ? (
        isPhone ? null : (
          <Text tone="inkSoft" align="right">
            still
          </Text>
        )
      ) : (
        <FormQuantityField
          control={control}
          name={`conditions.${name}.wind`}
          label={label('wind')}
          hideLabel={!isPhone}
          kind="speed"
        />
      )}
      <View style={isPhone ? styles.whole : undefined}>
        <FormTextField
          control={control}
          name={`conditions.${name}.source`}
          label={label('source')}
          hideLabel={!isPhone}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  row: webStyle({
    display: 'grid',
    gridTemplateColumns:
      'minmax(132px, 1.2fr) minmax(88px, 104px) minmax(76px, 88px) minmax(88px, 108px) minmax(120px, 1.6fr)',
    columnGap: space.xs,
    alignItems: 'center',
    paddingTop: space.xs,
    paddingBottom: space.xs,
  }),
  stack: webStyle({
    display: 'grid',
    gridTemplateColumns: '1fr 1fr',
    gap: space.xs,
    alignItems: 'start',
    paddingTop: space.sm,
    paddingBottom: space.sm,
  }),
  line: { borderTopWidth: hairline },
  whole: webStyle({ gridColumn: '1 / -1', minWidth: 0 }),
  title: { minWidth: 0 },
  start: { alignItems: 'flex-start' },
});
