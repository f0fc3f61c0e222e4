import { z } from 'zod';

import { dateSchema, line, optionalLine, paragraph, rowSchema } from './text';

/** What a takeoff is based on: levels, drawings and addenda of a job. */
export const levelInputSchema = z.object({ name: line(80), position: z.number().int().min(0).max(999) });
export const levelSchema = rowSchema.extend(levelInputSchema.shape);
export type Level = z.infer<typeof levelSchema>;
export type LevelInput = z.infer<typeof levelInputSchema>;

export const drawingInputSchema = z.object({
  number: line(40),
  title: optionalLine(120),
  revision: optionalLine(20),
  date: dateSchema.nullable(),
  scale: optionalLine(40),
});
export const drawingSchema = rowSchema.extend(drawingInputSchema.shape);
export type Drawing = z.infer<typeof drawingSchema>;
export type DrawingInput = z.infer<typeof drawingInputSchema>;

export const addendumInputSchema = z.object({
  number: z.number().int().min(1).max(999),
  date: dateSchema,
  changes: paragraph(2000),
  acknowledged: z.boolean(),
});
export const addendumSchema = rowSchema.extend(addendumInputSchema.shape);
export type Addendum = z.infer<typeof addendumSchema>;
export type AddendumInput = z.infer<typeof addendumInputSchema>;
