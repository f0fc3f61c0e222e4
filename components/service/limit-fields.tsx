import { useFieldArray, useWatch, type UseFormReturn } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';

import type { ServiceInput } from '@/api/contracts/service';
import { FormQuantityField } from '@/components/forms/form-quantity-field';
import { FormSelect } from '@/components/forms/form-select';
import { FormTextField } from '@/components/forms/form-text-field';
import { space } from '@/components/theme/tokens';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Checkbox } from '@/components/ui/checkbox';
import { Heading } from '@/components/ui/heading';
import { Grid, Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { blankLimit } from './blank-service';
import { serviceLimitWords } from './service-words';

type Form = UseFormReturn<ServiceInput>;
type LimitFieldsProps = { form: Form; places: readonly { id: string; name: string }[] };

/** Which limits decide the thickness of this service: everywhere, and differently in one place where that is needed. */
export function LimitFields({ form, places }: LimitFieldsProps) {
  const { control } = form;
  const { append, remove, update } = useFieldArray({ control, name: 'limits' });
  const limits = useWatch({ control, name: 'limits' });
  const [firstPlace] = places;
  return (
    <Stack gap="xs">
      <Heading>Limits that decide the thickness</Heading>
      {serviceLimitWords.map(({ kind, title, asks }) => {
        const index = limits.findIndex((limit) => limit.kind === kind && limit.placeId === null);
        return (
          <View key={kind}>
            <Checkbox
              label={`${title}: ${asks}`}
              checked={index >= 0}
              onChange={(applies) => (applies ? append(blankLimit(kind, null)) : remove(index))}
            />
            {index >= 0 ? <ValueFields form={form} index={index} /> : null}
          </View>
        );
      })}
      {limits.map((limit, index) =>
        limit.placeId === null ? null : (
          <PlacedLimit
            key={`${limit.placeId} ${limit.kind} ${index}`}
            form={form}
            index={index}
            places={places}
            onKind={(kind) => update(index, blankLimit(kind, limit.placeId))}
            onRemove={() => remove(index)}
          />
        ),
      )}
      {firstPlace ? (
        <View style={styles.start}>
          <Button
            label="Add a limit for one place only"
            onPress={() => append(blankLimit('heat-flow', firstPlace.id))}
          />
        </View>
      ) : null}
    </Stack>
  );
}

type LimitAt = { form: Form; index: number };

/** What a limit needs besides its name. */
function ValueFields({ form: { control }, index }: LimitAt) {
  const limit = useWatch({ control, name: `limits.${index}` });
  if (limit?.kind === 'dew-point')
    return (
      <View style={styles.values}>
        <FormQuantityField
          control={control}
          name={`limits.${index}.margin`}
          label="Above the dew point by at least"
          kind="difference"
        />
      </View>
    );
  if (limit?.kind === 'heat-flow')
    return (
      <View style={styles.values}>
        <Grid column={180} gap="sm">
          <FormQuantityField
            control={control}
            name={`limits.${index}.perLength`}
            label="For each length of pipe"
            kind="heatPerLength"
            blank={null}
          />
          <FormQuantityField
            control={control}
            name={`limits.${index}.flux`}
            label="For each area"
            kind="heatFlux"
            blank={null}
          />
        </Grid>
      </View>
    );
  if (limit?.kind === 'energy-code' && limit.placeId === null)
    return (
      <View style={styles.values}>
        <FormTextField
          control={control}
          name="codeExempt"
          label="Outside the table because"
          hint="Left empty, the table applies. A reason is printed with the service."
          optional
        />
      </View>
    );
  return null;
}

type PlacedLimitProps = LimitAt & {
  places: LimitFieldsProps['places'];
  onKind: (kind: ServiceInput['limits'][number]['kind']) => void;
  onRemove: () => void;
};

function PlacedLimit({ form, index, places, onKind, onRemove }: PlacedLimitProps) {
  const { control } = form;
  const choose = (chosen: string) => {
    const words = serviceLimitWords.find(({ kind }) => kind === chosen);
    if (words) onKind(words.kind);
  };
  return (
    <Card role="group" aria-label="A limit for one place only">
      <Grid column={180} gap="sm">
        <FormSelect
          control={control}
          name={`limits.${index}.placeId`}
          label="Only in"
          options={places.map(({ id, name }) => ({ value: id, label: name }))}
        />
        <FormSelect
          control={control}
          name={`limits.${index}.kind`}
          label="Limit"
          options={serviceLimitWords.map(({ kind, title }) => ({ value: kind, label: title }))}
          onChosen={choose}
        />
      </Grid>
      <ValueFields form={form} index={index} />
      <Row spread>
        <Text size="small" tone="inkSoft">
          Here it takes the place of the same limit everywhere.
        </Text>
        <Button label="Take it out" onPress={onRemove} />
      </Row>
    </Card>
  );
}

const styles = StyleSheet.create({
  values: { paddingTop: space.xxs, paddingLeft: 36, paddingBottom: space.xs, maxWidth: 560 },
  start: { alignItems: 'flex-start', paddingTop: space.xs },
});
