import { z } from 'zod';

import { limitKinds } from '@/api/engine/limits/study-types';

import { thicknessNameSchema } from './build-up';
import { assemblySchema, limitVerdictSchema, wordsSchema } from './study';
import { idSchema } from './text';

/** What a flag is about: a limit not met or not to be told, a hold, a run that nothing says how to insulate or that cannot be calculated. */
export const flagKinds = [...limitKinds, 'hold', 'not-specified', 'not-calculated'] as const;
export type FlagKind = (typeof flagKinds)[number];

export const flagSchema = z.object({
  runId: idSchema,
  kind: z.enum(flagKinds),
  verdict: limitVerdictSchema.nullable(),
  /** thinnest made name that meets this one limit; null: none is made, or none would help */
  meetsBy: z.object({ thickness: thicknessNameSchema, margin: z.number().nullable() }).nullable(),
  words: wordsSchema,
});
export type Flag = z.infer<typeof flagSchema>;

/** One run, judged at what is put up. Lengths in m. */
export const judgedRunSchema = z.object({
  runId: idSchema,
  assembly: assemblySchema.nullable(),
  names: z.array(thicknessNameSchema),
  outsideDiameter: z.number().nullable(),
  layerThicknesses: z.array(z.number()),
  body: z
    .object({ shape: z.enum(['cylinder', 'rectangle', 'wall']), width: z.number(), height: z.number() })
    .nullable(),
  nature: z.enum(['hot', 'cold']),
  /** the surface that stands nearest its limit, else under mean air */
  surface: z.number().nullable(),
  heatFlow: z.number().nullable(),
  flux: z.number().nullable(),
  governing: z.enum(limitKinds).nullable(),
  verdicts: z.array(limitVerdictSchema),
  flags: z.array(flagSchema),
  /** why it could not be calculated */
  problem: z.string().nullable(),
});
export type JudgedRun = z.infer<typeof judgedRunSchema>;

export const judgementSchema = z.object({ runs: z.array(judgedRunSchema), engineVersion: z.string() });
export type Judgement = z.infer<typeof judgementSchema>;
