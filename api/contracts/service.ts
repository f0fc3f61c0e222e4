import { z } from 'zod';

import { quantitySchema } from './quantities';
import { idSchema, line, optionalLine, rowSchema } from './text';

const fluidTemperature = quantitySchema('temperature', { min: -200, max: 1000 });

/** A fluid's temperatures in one state; a dual-temperature service has two. */
export const fluidStateSchema = z
  .object({
    nature: z.enum(['hot', 'cold']),
    operating: fluidTemperature,
    lowest: fluidTemperature,
    highest: fluidTemperature,
  })
  .refine(({ lowest, operating }) => lowest.value <= operating.value, {
    path: ['lowest'],
    error: 'Must not be above operating',
  })
  .refine(({ operating, highest }) => operating.value <= highest.value, {
    path: ['highest'],
    error: 'Must not be below operating',
  });
export type FluidStateOfService = z.infer<typeof fluidStateSchema>;

/** Limits that are built; `placeId` null: wherever the service runs. */
const somewhere = { placeId: idSchema.nullable() };
export const serviceLimitSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('touch'), ...somewhere }),
  z.object({ kind: z.literal('dew-point'), ...somewhere, margin: quantitySchema('difference', { min: 0, max: 10 }) }),
  z.object({ kind: z.literal('energy-code'), ...somewhere }),
  z.object({
    kind: z.literal('heat-flow'),
    ...somewhere,
    perLength: quantitySchema('heatPerLength', { above: 0, max: 1e6 }).nullable(),
    flux: quantitySchema('heatFlux', { above: 0, max: 1e6 }).nullable(),
  }),
  z.object({ kind: z.literal('material'), ...somewhere }),
]);
export type ServiceLimit = z.infer<typeof serviceLimitSchema>;

export const serviceInputSchema = z.object({
  name: line(80),
  fluid: line(60),
  states: z.array(fluidStateSchema).min(1).max(2),
  hours: quantitySchema('hours', { min: 0, max: 8784 }),
  codeExempt: optionalLine(200),
  limits: z.array(serviceLimitSchema).max(20),
  note: optionalLine(400),
  position: z.number().int().min(0).max(999),
});
export type ServiceInput = z.infer<typeof serviceInputSchema>;
export const serviceSchema = rowSchema.extend(serviceInputSchema.shape);
export type Service = z.infer<typeof serviceSchema>;
