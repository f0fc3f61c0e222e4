import type { UseFormReturn } from 'react-hook-form';

import { useBound } from '@/components/forms/bound';
import { Checkbox } from '@/components/ui/checkbox';
import { ProblemText } from '@/components/ui/field';
import { Grid, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import type { CoveringDraft } from './covering-draft';
import type { Named } from './covering-words';

/** In which places it applies; with none picked it applies everywhere. */
export function PlacePicks({
  control,
  places,
}: Pick<UseFormReturn<CoveringDraft>, 'control'> & { places: readonly Named[] }) {
  const { value: picked, change, leave, problem } = useBound({ control, name: 'placeIds' });
  const pick = (id: string, isPicked: boolean) =>
    change(isPicked ? [...picked, id] : picked.filter((other) => other !== id));
  return (
    <Stack gap="xxs" role="group" aria-label="Places">
      <Text weight="strong">Places</Text>
      <Text size="small" tone="inkSoft">
        {picked.length === 0 ? 'None is picked: it applies everywhere.' : 'Only in the places that are picked.'}
      </Text>
      <Grid column={200} gap="xxs">
        {places.map(({ id, name }) => (
          <Checkbox
            key={id}
            label={name}
            checked={picked.includes(id)}
            onChange={(isPicked) => pick(id, isPicked)}
            onBlur={leave}
          />
        ))}
      </Grid>
      {problem ? <ProblemText text={problem} /> : null}
    </Stack>
  );
}
