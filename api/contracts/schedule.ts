import { z } from 'zod';

import { limitKinds } from '@/api/engine/limits/study-types';

import { bodyKinds, thicknessNameSchema } from './build-up';
import { fittingKinds } from './run';
import { assemblySources, wordsSchema } from './study';
import { idSchema } from './text';
import { vapourRetarders } from '@/api/engine/standards/rows';

/** The section that is drawn beside a row, in m from the pipe outwards. */
export const drawnSectionSchema = z.object({
  shape: z.enum(['cylinder', 'rectangle', 'wall']),
  width: z.number(),
  height: z.number(),
  layers: z.array(z.object({ materialId: z.string(), thickness: z.number() })),
  nature: z.enum(['hot', 'cold']),
});
export type DrawnSection = z.infer<typeof drawnSectionSchema>;

/** One line of the schedule: a service, the sizes and places that are insulated alike, and what decides. */
export const scheduleRowSchema = z.object({
  key: z.string(),
  serviceId: idSchema,
  service: z.string(),
  appliesTo: z.enum(bodyKinds),
  operating: z.array(z.number()),
  sizes: z.array(z.string()),
  places: z.array(z.string()),
  layers: z.array(z.object({ material: z.string(), thickness: thicknessNameSchema.nullable() })),
  finish: z.string(),
  vapourRetarder: z.enum(vapourRetarders),
  source: z.enum(assemblySources),
  specificationLabel: z.string().nullable(),
  reasons: z.array(z.string()),
  governing: z.enum(limitKinds).nullable(),
  decides: wordsSchema,
  runIds: z.array(idSchema),
  runNumbers: z.array(z.string()),
  flags: z.number().int(),
  section: drawnSectionSchema.nullable(),
});
export type ScheduleRow = z.infer<typeof scheduleRowSchema>;
export const scheduleSchema = z.object({ rows: z.array(scheduleRowSchema) });
export type Schedule = z.infer<typeof scheduleSchema>;

const fittingCounts = z.array(z.object({ kind: z.enum(fittingKinds), count: z.number().int() }));

/** Net quantities: measured, nothing rounded; lengths m, areas m² of the finished surface. */
export const takeoffLineSchema = z.object({
  key: z.string(),
  appliesTo: z.enum(bodyKinds),
  service: z.string(),
  size: z.string(),
  material: z.string(),
  names: z.array(thicknessNameSchema),
  finish: z.string(),
  length: z.number().nullable(),
  area: z.number().nullable(),
  count: z.number().int().nullable(),
  fittings: fittingCounts,
  runIds: z.array(idSchema),
  runNumbers: z.array(z.string()),
});
export type TakeoffLine = z.infer<typeof takeoffLineSchema>;
export const takeoffSchema = z.object({
  lines: z.array(takeoffLineSchema),
  fittings: fittingCounts,
  /** measured lengths, areas and counts by others or on hold are told apart */
  byOthers: z.array(z.string()),
  onHold: z.array(z.string()),
});
export type Takeoff = z.infer<typeof takeoffSchema>;
