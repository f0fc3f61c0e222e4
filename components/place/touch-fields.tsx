import { useWatch, type UseFormReturn } from 'react-hook-form';

import type { PlaceInput } from '@/api/contracts/place';
import { FormQuantityField } from '@/components/forms/form-quantity-field';
import { FormSegmented } from '@/components/forms/form-segmented';
import { FormTextField } from '@/components/forms/form-text-field';
import { Button } from '@/components/ui/button';
import { Grid, Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useSafety } from '@/hooks/use-library';
import { useUnits } from '@/hooks/use-units';

import { degreesText, reachWords } from './place-words';
import { sourceOf, touchSuggestions, type TouchSuggestion } from './touch-suggestions';

type TouchFieldsProps = { form: UseFormReturn<PlaceInput> };

const segments = [
  { value: 'nobody', label: reachWords.nobody },
  { value: 'trained', label: reachWords.trained },
  { value: 'public', label: reachWords.public },
];

/** Who can reach a surface here, and the limit that follows; the usual ones are offered, the project decides. */
export function TouchFields({ form }: TouchFieldsProps) {
  const { control, getValues, setValue } = form;
  const { data: safety } = useSafety();
  const [reach, limit] = useWatch({ control, name: ['reach', 'touchLimit'] });
  const suggestions = touchSuggestions(reach, safety).filter((one) => one.limit !== limit?.value);
  const take = (suggestion: TouchSuggestion) => {
    const put = { shouldDirty: true, shouldValidate: true };
    setValue('touchLimit', { value: suggestion.limit }, put);
    setValue('touchLimitSource', sourceOf(suggestion), put);
  };
  // a limit that was only suggested follows the reach; one that somebody set stays
  const follow = (chosen: string) => {
    const kept = getValues();
    const isOwn = kept.touchLimit && !safety?.touchDefaults.some((one) => sourceOf(one) === kept.touchLimitSource);
    if (isOwn) return;
    const [usual] = chosen === 'trained' || chosen === 'public' ? touchSuggestions(chosen, safety) : [];
    if (usual) take(usual);
    else {
      setValue('touchLimit', null, { shouldDirty: true });
      setValue('touchLimitSource', '', { shouldDirty: true });
    }
  };
  return (
    <Stack gap="sm">
      <FormSegmented
        control={control}
        name="reach"
        label="Who can reach a surface here"
        segments={segments}
        onChosen={follow}
      />
      {reach === 'nobody' ? null : (
        <>
          <Grid column={320}>
            <FormQuantityField
              control={control}
              name="touchLimit"
              label="Touch limit"
              kind="temperature"
              blank={null}
            />
            <FormTextField control={control} name="touchLimitSource" label="Who says so" />
          </Grid>
          <Suggestions suggestions={suggestions} onTake={take} />
        </>
      )}
    </Stack>
  );
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

type SuggestionsProps = { suggestions: readonly TouchSuggestion[]; onTake: (suggestion: TouchSuggestion) => void };

function Suggestions({ suggestions, onTake }: SuggestionsProps) {
  const { units } = useUnits();
  return (
    <Stack gap="sm">
      {suggestions.map((suggestion) => (
        <Row key={suggestion.id} wrap={false}>
          <Button label={`Use ${degreesText(suggestion.limit, units)}`} onPress={() => onTake(suggestion)} />
          <Stack gap="xxs" grow>
            <Text size="small">{capital(suggestion.where)}</Text>
            <Text size="small" tone="inkSoft">
              {`${capital(suggestion.basis)}. ${suggestion.source}`}
            </Text>
          </Stack>
        </Row>
      ))}
      <Text size="small" tone="inkSoft">
        These are starting values. The local code, the authority having jurisdiction and the project decide.
      </Text>
    </Stack>
  );
}
