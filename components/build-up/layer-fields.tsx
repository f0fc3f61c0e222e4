import { useFieldArray, useWatch, type UseFormReturn } from 'react-hook-form';

import { FormQuantityField } from '@/components/forms/form-quantity-field';
import { FormSelect } from '@/components/forms/form-select';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Heading } from '@/components/ui/heading';
import { Grid, Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { blankLayer, type CoveringDraft } from './covering-draft';
import { isCompressed, notStocked, thicknessOptions, type LayerLibrary } from './layer-options';

type LayerFieldsProps = Pick<UseFormReturn<CoveringDraft>, 'control' | 'setValue'> & {
  library: LayerLibrary;
  /** a build-up leaves the outermost thickness to the study */
  isOutermostOpen: boolean;
};

/** One to three layers, from the pipe outwards. */
export function LayerFields(props: LayerFieldsProps) {
  const { control, setValue, isOutermostOpen } = props;
  const { fields, append, remove } = useFieldArray({ control, name: 'layers' });
  const takeOut = (index: number) => {
    remove(index);
    // what was second to last is outermost now
    if (isOutermostOpen && index === fields.length - 1) setValue(`layers.${index - 1}.thickness`, null);
  };
  return (
    <Stack gap="sm">
      <Heading>Layers, from the inside out</Heading>
      {fields.map(({ id }, index) => (
        <LayerCard
          key={id}
          {...props}
          index={index}
          count={fields.length}
          onTakeOut={fields.length > 1 ? () => takeOut(index) : undefined}
        />
      ))}
      {fields.length < 3 ? (
        <Row>
          <Button label="Add a layer over it" onPress={() => append(blankLayer)} />
        </Row>
      ) : null}
    </Stack>
  );
}

type LayerCardProps = LayerFieldsProps & { index: number; count: number; onTakeOut?: () => void };

function LayerCard({ control, setValue, library, isOutermostOpen, index, count, onTakeOut }: LayerCardProps) {
  const materialId = useWatch({ control, name: `layers.${index}.materialId` });
  const thickness = useWatch({ control, name: `layers.${index}.thickness` });
  const options = thicknessOptions(materialId, library);
  const isOpen = isOutermostOpen && index === count - 1;
  const title = layerTitle(index, count);
  // a thickness that the new material is not stocked in has to be chosen again
  const settle = (chosen: string) => {
    const isMade = thicknessOptions(chosen, library).some(
      ({ value, group }) => value === thickness && group !== notStocked,
    );
    if (!isMade) setValue(`layers.${index}.thickness`, null, { shouldDirty: true });
  };
  return (
    <Card role="group" aria-label={title}>
      {count > 1 ? (
        <Row spread>
          <Text weight="strong">{title}</Text>
          {onTakeOut ? <Button label="Take it out" name={`Take out: ${title}`} onPress={onTakeOut} /> : null}
        </Row>
      ) : null}
      <Grid column={200} gap="sm">
        <FormSelect
          control={control}
          name={`layers.${index}.materialId`}
          label="Material"
          placeholder="Choose a material"
          options={library.materials.map(({ id, name }) => ({ value: id, label: name }))}
          onChosen={settle}
        />
        {isOpen ? (
          <Stack gap="xxs">
            <Text weight="strong">Thickness</Text>
            <Text tone="inkSoft">Left to the study: the thinnest that is made and meets every limit.</Text>
          </Stack>
        ) : (
          <FormSelect
            control={control}
            name={`layers.${index}.thickness`}
            label="Thickness"
            placeholder={materialId ? 'Choose a thickness' : 'Choose the material first'}
            options={options}
            disabled={!materialId}
          />
        )}
        {!isOpen && isCompressed(materialId, library) ? (
          <FormQuantityField
            control={control}
            name={`layers.${index}.installed`}
            label="As put up"
            kind="dimension"
            blank={null}
            optional
            hint="Left empty, three quarters of the name are counted"
          />
        ) : null}
      </Grid>
    </Card>
  );
}

function layerTitle(index: number, count: number): string {
  if (count === 1) return 'Layer';
  if (index === 0) return 'On the pipe or duct';
  return index === count - 1 ? 'Outermost' : 'Over it';
}
