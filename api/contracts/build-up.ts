import { z } from 'zod';

import { vapourRetarders } from '@/api/engine/standards/rows';
import { isThicknessName, type ThicknessName } from '@/api/engine/standards/thickness-name';

import { quantitySchema } from './quantities';
import { idSchema, line, optionalLine, rowSchema } from './text';

export const thicknessNameSchema = z
  .string()
  .max(12)
  .refine((text): text is ThicknessName => isThicknessName(text), { error: 'Not a thickness name' });

/** A library id: `std/...` for standard rows in code, `own/...` for a firm's own. */
export const libraryIdSchema = z.string().regex(/^(std|own)\/[a-z0-9_-]{1,60}$/, 'Not a row of the library');

/** `installed`: a wrap's thickness as put up, when the specification gives it. */
export const layerSchema = z.object({
  materialId: libraryIdSchema,
  thickness: thicknessNameSchema.nullable(),
  installed: quantitySchema('dimension', { above: 0, max: 0.5 }).nullable(),
});
export type Layer = z.infer<typeof layerSchema>;

const named = layerSchema.refine(({ thickness }) => thickness !== null, {
  path: ['thickness'],
  error: 'Must be chosen',
});

export const bodyKinds = ['pipe', 'duct', 'equipment'] as const;
export type BodyKind = (typeof bodyKinds)[number];

/** Where a row of the specification or a build-up applies; no places: all of them; no DN: every size. */
const scope = {
  serviceId: idSchema,
  appliesTo: z.enum(bodyKinds),
  placeIds: z.array(idSchema).max(50),
  fromDn: z.number().int().min(0).max(5000).nullable(),
  toDn: z.number().int().min(0).max(5000).nullable(),
};
const covering = { finishId: libraryIdSchema, vapourRetarder: z.enum(vapourRetarders), note: optionalLine(400) };

/** With what a service is insulated; the outermost layer's thickness is left to the study. */
export const buildUpInputSchema = z.object({ ...scope, ...covering, layers: z.array(layerSchema).min(1).max(3) });
export type BuildUpInput = z.infer<typeof buildUpInputSchema>;
export const buildUpSchema = rowSchema.extend(buildUpInputSchema.shape);
export type BuildUp = z.infer<typeof buildUpSchema>;

/** A row of the specification as handed down: every thickness by name. */
export const specificationRowInputSchema = z.object({
  ...scope,
  ...covering,
  label: line(20),
  layers: z.array(named).min(1).max(3),
});
export type SpecificationRowInput = z.infer<typeof specificationRowInputSchema>;
export const specificationRowSchema = rowSchema.extend(specificationRowInputSchema.shape);
export type SpecificationRow = z.infer<typeof specificationRowSchema>;
