import { useFormContext, useWatch } from 'react-hook-form';

import { buildUpInputSchema } from '@/api/contracts/build-up';
import { DrawnSection } from '@/components/drawing/drawn';
import { Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import type { CoveringDraft } from './covering-draft';
import { drawnCovering } from './covering-glyph';
import { layerText, nameIn, type CoveringNames } from './covering-words';

const draftSchema = buildUpInputSchema.pick({ layers: true, fromDn: true, toDn: true, appliesTo: true });

/** What is being entered, cut and drawn to scale: a slipped layer is seen before it is saved. */
export function CoveringPreview({ names }: { names: CoveringNames }) {
  const { control } = useFormContext<CoveringDraft>();
  const [serviceId, finishId, appliesTo, fromDn, toDn, layers] = useWatch({
    control,
    name: ['serviceId', 'finishId', 'appliesTo', 'fromDn', 'toDn', 'layers'],
  });
  const draft = draftSchema.safeParse({ appliesTo, fromDn, toDn, layers }).data;
  const drawn = draft && drawnCovering({ ...draft, serviceId }, names);
  if (!draft || !drawn) return null;
  const finish = nameIn(names.finishes, finishId);
  return (
    <Row gap="md">
      <DrawnSection drawn={drawn} size={120} />
      <Stack gap="xxs">
        <Text size="small" tone="inkSoft">
          {draft.appliesTo === 'pipe' ? 'To scale, on the smallest of its pipes' : 'To scale'}
        </Text>
        {draft.layers.map((layer, index) => (
          <Text key={index}>{layerText(layer, names)}</Text>
        ))}
        {finish ? <Text weight="strong">{finish}</Text> : null}
      </Stack>
    </Row>
  );
}
