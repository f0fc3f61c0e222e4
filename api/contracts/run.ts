import { z } from 'zod';

import { pipeStandards, vapourRetarders } from '@/api/engine/standards/rows';

import { layerSchema, libraryIdSchema } from './build-up';
import { quantitySchema } from './quantities';
import { fluidStateSchema } from './service';
import { idSchema, line, optionalLine, rowSchema } from './text';

const length = quantitySchema('length', { above: 0, max: 100_000 });
const dimension = quantitySchema('dimension', { above: 0, max: 20 });

/** A size is a standard and a nominal; a free diameter only under "other". */
export const sizeSchema = z.discriminatedUnion('standard', [
  z.object({ standard: z.enum(pipeStandards), nominal: line(20) }),
  z.object({ standard: z.literal('other'), outsideDiameter: dimension }),
]);
export type Size = z.infer<typeof sizeSchema>;

const orientation = z.enum(['horizontal', 'vertical']);
const count = z
  .number({ error: 'Must be a number' })
  .int('Must be a whole number')
  .min(1, 'Must be at least 1')
  .max(9999, 'At most 9999');

export const shapeSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('pipe'), size: sizeSchema, length, orientation }),
  z.object({ kind: z.literal('round-duct'), diameter: dimension, length }),
  z.object({ kind: z.literal('rectangular-duct'), width: dimension, height: dimension, length }),
  z.object({
    kind: z.literal('vessel'),
    diameter: dimension,
    length: dimension,
    orientation,
    ends: z.enum(['none', 'flat', 'domed']),
    count,
  }),
  z.object({ kind: z.literal('flat'), area: quantitySchema('area', { above: 0, max: 1e5 }), height: dimension, count }),
  z.object({ kind: z.literal('piece'), count }),
]);
export type Shape = z.infer<typeof shapeSchema>;
export type ShapeKind = Shape['kind'];

export const pipeFittings = [
  'elbow-90',
  'elbow-45',
  'tee',
  'reducer',
  'cap',
  'screwed-valve',
  'flanged-valve',
  'flange-pair',
  'strainer',
  'hanger',
] as const;
export const ductFittings = ['elbow', 'transition', 'take-off', 'access-door'] as const;
export const fittingKinds = [...pipeFittings, ...ductFittings] as const;
export type FittingKind = (typeof fittingKinds)[number];
const counted = z
  .number({ error: 'Must be a number' })
  .int('Must be a whole number')
  .min(0, 'Must be at least 0')
  .max(9999, 'At most 9999');
const isCounted = ([, number]: [string, number | null | undefined]) => typeof number === 'number';
const kindOfFitting = z.enum(fittingKinds);
/** How many of each kind; a form holds `null` or nothing where there are none, which is not stored. */
export const fittingsSchema = z
  .partialRecord(kindOfFitting, counted.nullish())
  .transform((fittings) => Object.fromEntries(Object.entries(fittings).filter(isCounted)))
  .pipe(z.partialRecord(kindOfFitting, counted));
export type Fittings = z.infer<typeof fittingsSchema>;

/** A departure from the specification row; kept and printed with its reason. */
export const overrideSchema = z.object({
  reason: line(400),
  state: fluidStateSchema.nullable(),
  layers: z.array(layerSchema).min(1).max(3).nullable(),
  finishId: libraryIdSchema.nullable(),
  vapourRetarder: z.enum(vapourRetarders).nullable(),
  codeExempt: optionalLine(200),
});
export type Override = z.infer<typeof overrideSchema>;

export const runStatuses = ['measured', 'assumed', 'by-others', 'on-hold'] as const;
export type RunStatus = (typeof runStatuses)[number];

export const runInputSchema = z
  .object({
    number: line(20),
    title: optionalLine(120),
    serviceId: idSchema,
    placeId: idSchema,
    levelId: idSchema,
    drawingId: idSchema.nullable(),
    shape: shapeSchema,
    elevation: quantitySchema('elevation', { min: -500, max: 1000 }).nullable(),
    fittings: fittingsSchema,
    status: z.enum(runStatuses),
    hold: z.object({ reason: line(300), by: line(120) }).nullable(),
    override: overrideSchema.nullable(),
    note: optionalLine(600),
  })
  .refine(({ status, hold }) => (status === 'on-hold') === (hold !== null), {
    path: ['hold'],
    error: 'A run on hold names the reason and who placed it',
  });
export type RunInput = z.infer<typeof runInputSchema>;
/** As a form holds it, before it is checked. */
export type RunDraft = z.input<typeof runInputSchema>;

export const runSchema = rowSchema.extend(runInputSchema.shape);
export type Run = z.infer<typeof runSchema>;

/** The client makes the id (offline, retry); version null: a new run. */
export const runPutSchema = z.object({
  ...runInputSchema.shape,
  id: idSchema,
  version: z.number().int().positive().nullable(),
});
export const runsPatchSchema = z.object({
  put: z.array(runPutSchema).max(500, 'At most 500 runs at once'),
  drop: z.array(rowSchema).max(500, 'At most 500 runs at once'),
});
export type RunsPatch = z.infer<typeof runsPatchSchema>;
export const runsPatchedSchema = z.object({ put: z.array(runSchema), dropped: z.array(idSchema) });
