import type { DefaultValues } from 'react-hook-form';
import type { z } from 'zod';

import { buildUpInputSchema, specificationRowInputSchema, type BuildUpInput } from '@/api/contracts/build-up';

/** What build-ups and specification rows share while they are typed. */
export type CoveringDraft = z.input<typeof buildUpInputSchema>;
type LayerDraft = CoveringDraft['layers'][number];

/** Only the outermost thickness of a build-up is left to the study. */
export const buildUpDraftSchema = buildUpInputSchema.superRefine(({ layers }, context) => {
  layers.slice(0, -1).forEach(({ thickness }, index) => {
    if (thickness !== null) return;
    context.addIssue({ code: 'custom', path: ['layers', index, 'thickness'], message: innerOpen });
  });
  checkBand(context);
});
const innerOpen = 'Must be chosen: only the outermost layer is left to the study';

export const specificationDraftSchema = specificationRowInputSchema.superRefine((_row, context) => checkBand(context));

function checkBand({ value, addIssue }: z.RefinementCtx<Pick<BuildUpInput, 'fromDn' | 'toDn'>>): void {
  const { fromDn, toDn } = value;
  if (fromDn === null || toDn === null || fromDn <= toDn) return;
  addIssue({ code: 'custom', path: ['toDn'], message: 'Must not be smaller than the first size' });
}

export const blankLayer: LayerDraft = { materialId: '', thickness: null, installed: null };

export const blankCovering = {
  serviceId: '',
  appliesTo: 'pipe',
  placeIds: [],
  fromDn: null,
  toDn: null,
  layers: [blankLayer],
  finishId: '',
  vapourRetarder: 'none',
  note: '',
} satisfies DefaultValues<CoveringDraft>;
