import { useFormContext, useWatch } from 'react-hook-form';

import type { LibraryFinish } from '@/api/contracts/library';
import type { Service } from '@/api/contracts/service';
import { FormSegmented } from '@/components/forms/form-segmented';
import { FormSelect } from '@/components/forms/form-select';
import { FormTextField } from '@/components/forms/form-text-field';
import { Grid, Stack } from '@/components/ui/stack';

import { BandFields } from './band-fields';
import type { CoveringDraft } from './covering-draft';
import { CoveringPreview } from './covering-preview';
import { bodyWords, retarderWords, type CoveringNames } from './covering-words';
import { LayerFields } from './layer-fields';
import type { LayerLibrary } from './layer-options';
import { PlacePicks } from './place-picks';

/** What a covering is chosen from. */
export type CoveringChoices = {
  names: CoveringNames;
  library: LayerLibrary;
  finishes: readonly LibraryFinish[];
  services: readonly Service[];
};

type CoveringFieldsProps = CoveringChoices & { isOutermostOpen: boolean };

const bodies = Object.entries(bodyWords).map(([value, label]) => ({ value, label }));
const retarders = Object.entries(retarderWords).map(([value, label]) => ({ value, label }));

/** Where it applies, with what it is covered, from the pipe outwards. */
export function CoveringFields({ names, library, finishes, services, isOutermostOpen }: CoveringFieldsProps) {
  const { control, setValue } = useFormContext<CoveringDraft>();
  const appliesTo = useWatch({ control, name: 'appliesTo' });
  const finishId = useWatch({ control, name: 'finishId' });
  // a duct or a vessel has no nominal size
  const forget = (chosen: string) => {
    if (chosen === 'pipe') return;
    setValue('fromDn', null);
    setValue('toDn', null);
  };
  return (
    <>
      <Grid column={320}>
        <FormSelect
          control={control}
          name="serviceId"
          label="Service"
          placeholder="Choose a service"
          options={services.map(({ id, name }) => ({ value: id, label: name }))}
        />
        <FormSegmented control={control} name="appliesTo" label="Applies to" segments={bodies} onChosen={forget} />
      </Grid>
      {appliesTo === 'pipe' ? <BandFields control={control} names={names} /> : null}
      <PlacePicks control={control} places={names.places} />
      <LayerFields control={control} setValue={setValue} library={library} isOutermostOpen={isOutermostOpen} />
      <Grid column={320}>
        <FormSelect
          control={control}
          name="finishId"
          label="Finish"
          placeholder="Choose a finish"
          options={finishes.filter(({ bare }) => !bare).map(({ id, name }) => ({ value: id, label: name }))}
          hint={emittanceText(finishes.find(({ id }) => id === finishId))}
        />
        <Retarder services={services} />
      </Grid>
      <CoveringPreview names={names} />
      <FormTextField control={control} name="note" label="Note" optional hint="For the firm: it is not printed" />
    </>
  );
}

function Retarder({ services }: Pick<CoveringChoices, 'services'>) {
  const { control } = useFormContext<CoveringDraft>();
  const [serviceId, retarder] = useWatch({ control, name: ['serviceId', 'vapourRetarder'] });
  const service = services.find(({ id }) => id === serviceId);
  return (
    <Stack gap="xxs">
      <FormSelect
        control={control}
        name="vapourRetarder"
        label="Vapour retarder"
        options={retarders}
        hint={retarder === 'none' && service && isCold(service) ? missingRetarder : undefined}
      />
    </Stack>
  );
}

// public master specifications draw the line at 60 °F
const isCold = ({ states }: Service) => states.some(({ lowest }) => lowest.value <= 16);
const missingRetarder = 'This service gets colder than 16 °C: specifications usually ask for a vapour retarder there.';

function emittanceText(finish: LibraryFinish | undefined): string | undefined {
  if (!finish) return undefined;
  const { emittanceNew, emittanceAged } = finish;
  return `Emittance ${emittanceNew.toFixed(2)} as new, ${emittanceAged.toFixed(2)} aged`;
}
