import { z } from 'zod';

import { conditionSets, limitKinds } from '@/api/engine/limits/study-types';
import type { Words, WordsKind } from '@/api/engine/words';

import { libraryIdSchema, thicknessNameSchema } from './build-up';
import { quantities } from './quantities';
import { idSchema } from './text';
import { vapourRetarders } from '@/api/engine/standards/rows';

const number = z.number();
const isKind = (kind: string): kind is WordsKind => kind in quantities;

/** A sentence without units: the reader's screen or document puts the numbers in its own. */
export const wordsSchema: z.ZodType<Words> = z.array(
  z.union([
    z.string(),
    z.object({ kind: z.string().refine(isKind), value: number, digits: number.optional() }),
    z.object({ thickness: z.array(thicknessNameSchema) }),
  ]),
);

export const judgedAtSchema = z.object({
  set: z.enum(conditionSets),
  fluid: number,
  air: number,
  humidity: number.nullable(),
  wind: number,
  emittance: number,
  source: z.string(),
});
export type JudgedAt = z.infer<typeof judgedAtSchema>;

export const limitVerdictSchema = z.object({
  kind: z.enum(limitKinds),
  verdict: z.enum(['met', 'not-met', 'does-not-apply', 'cannot-tell']),
  because: wordsSchema,
  value: number.nullable(),
  limit: number.nullable(),
  margin: number.nullable(),
  unit: z.enum(['temperature', 'difference', 'dimension', 'heatPerLength', 'heatFlux', 'resistance']).nullable(),
  state: z.enum(['dry', 'marginal', 'sweats']).nullable(),
  dewPoint: number.nullable(),
  sweatsFrom: number.nullable(),
  judgedAt: judgedAtSchema.nullable(),
  source: z.string(),
});
export type LimitVerdict = z.infer<typeof limitVerdictSchema>;

export const heatAnswerSchema = z.object({
  heatFlow: number.nullable(),
  flux: number,
  surface: number,
  interfaces: z.array(number),
  meanConductivities: z.array(number),
  coefficient: number,
  convective: number,
  radiative: number,
  closure: number,
  judgedAt: judgedAtSchema,
  notes: z.array(z.string()),
});

export const candidateSchema = z.object({
  name: thicknessNameSchema.nullable(),
  names: z.array(thicknessNameSchema),
  outsideDiameter: number.nullable(),
  layerThicknesses: z.array(number),
  basis: z.enum(['made', 'nominal', 'bare']),
  heat: heatAnswerSchema,
  verdicts: z.array(limitVerdictSchema),
  meetsAll: z.boolean(),
  notes: z.array(z.string()),
});
export type Candidate = z.infer<typeof candidateSchema>;

export const studySchema = z.object({
  candidates: z.array(candidateSchema),
  specified: number.nullable(),
  proposed: number.nullable(),
  governing: z.enum(limitKinds).nullable(),
  meets: z.array(z.object({ kind: z.enum(limitKinds), candidate: number.nullable() })),
  sentence: wordsSchema,
  whyNotThinner: wordsSchema,
  engineVersion: z.string(),
  method: z.enum(['astm-c680', 'iso-12241']),
  notes: z.array(z.string()),
});
export type Study = z.infer<typeof studySchema>;

/** With what a run is insulated, and who says so: chosen over specified over proposed. */
export const assemblySources = ['chosen', 'specified', 'proposed'] as const;
export const assemblySchema = z.object({
  source: z.enum(assemblySources),
  /** the specification row that applies, even where something else was chosen */
  specificationLabel: z.string().nullable(),
  reason: z.string(),
  layers: z.array(
    z.object({ materialId: libraryIdSchema, materialName: z.string(), thickness: thicknessNameSchema.nullable() }),
  ),
  finishId: libraryIdSchema,
  finishName: z.string(),
  vapourRetarder: z.enum(vapourRetarders),
  codeExempt: z.string(),
});
export type Assembly = z.infer<typeof assemblySchema>;

/** A run's study as a screen needs it; `used` is the candidate that is put up, null when nothing made meets all. */
export const runStudySchema = z.object({
  runId: idSchema,
  assembly: assemblySchema,
  body: z.object({ shape: z.enum(['cylinder', 'rectangle', 'wall']), width: number, height: number }),
  study: studySchema,
  used: number.nullable(),
});
export type RunStudy = z.infer<typeof runStudySchema>;

export const workingSchema = z.object({
  title: z.string(),
  steps: z.array(
    z.object({
      title: z.string(),
      equation: z.string(),
      filled: wordsSchema,
      result: wordsSchema,
      inputs: z.array(z.object({ symbol: z.string(), meaning: z.string(), value: wordsSchema, source: z.string() })),
      source: z.string(),
    }),
  ),
  notes: z.array(z.string()),
  engineVersion: z.string(),
});
export type Working = z.infer<typeof workingSchema>;

/** Which number of a study is opened, of what is put up unless another candidate is named; in a query a number is text. */
export const workingAskedSchema = z.object({
  candidate: z.coerce.number({ error: 'Must be a number' }).int('Must be a whole number').min(0).optional(),
  about: z.enum(['surface', ...limitKinds]).default('heat-flow'),
});
export type WorkingAsked = z.infer<typeof workingAskedSchema>;
