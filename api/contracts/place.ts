import { z } from 'zod';

import { reaches } from '@/api/engine/limits/study-types';

import { quantitySchema } from './quantities';
import { line, optionalLine, rowSchema } from './text';

/** One condition set: the air and who says so. Dry bulb −60 to 80 °C. */
export const conditionsSchema = z.object({
  air: quantitySchema('temperature', { min: -60, max: 80 }),
  humidity: quantitySchema('humidity', { above: 0, max: 100 }).nullable(),
  wind: quantitySchema('speed', { min: 0, max: 60 }),
  source: line(160),
});
export type ConditionsOfPlace = z.infer<typeof conditionsSchema>;

export const placeInputSchema = z.object({
  name: line(80),
  reach: z.enum(reaches),
  touchLimit: quantitySchema('temperature', { min: 30, max: 100 }).nullable(),
  touchLimitSource: optionalLine(200),
  outdoor: z.boolean(),
  plenum: z.boolean(),
  ductLocation: z.string().max(60).nullable(),
  note: optionalLine(400),
  conditions: z.object({
    hottest: conditionsSchema,
    mostHumid: conditionsSchema.extend({ humidity: quantitySchema('humidity', { above: 0, max: 100 }) }),
    coldest: conditionsSchema,
    warmest: conditionsSchema,
    mean: conditionsSchema,
  }),
});
export type PlaceInput = z.infer<typeof placeInputSchema>;
export const placeSchema = rowSchema.extend(placeInputSchema.shape);
export type Place = z.infer<typeof placeSchema>;
