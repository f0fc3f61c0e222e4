import { z } from 'zod';

import { quantitySchema } from './quantities';
import { dateSchema, idSchema, line, optionalLine, paragraph, rowSchema } from './text';

/** A moment as people agree on it: local date and time, and the zone they mean. */
export const momentSchema = z.object({
  date: dateSchema,
  time: z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'Must be a time like 14:00'),
  zone: z.string().refine(isZone, { error: 'Not a known time zone' }),
});
export type Moment = z.infer<typeof momentSchema>;

function isZone(zone: string): boolean {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: zone }).resolvedOptions().timeZone !== '';
  } catch {
    return false;
  }
}

export const specificationTitleSchema = z.object({
  number: optionalLine(60),
  title: optionalLine(160),
  revision: optionalLine(40),
  date: dateSchema.nullable(),
});

export const jobInputSchema = z.object({
  number: line(24),
  name: line(160),
  site: optionalLine(160),
  scope: paragraph(2000),
  contactIds: z.array(idSchema).max(20, 'At most 20 contacts'),
  bidDue: momentSchema.nullable(),
  currency: z.string().regex(/^[A-Z]{3}$/, 'Must be a currency code like EUR'),
  codeEdition: line(60),
  climateZone: z.string().regex(/^[0-8][ABC]?$/, 'Must be a zone like 4A'),
  altitude: quantitySchema('altitude', { min: -430, max: 6000 }),
  documentUnits: z.enum(['SI']),
  seriesUnit: z.enum(['in', 'mm']),
  surfaceMethod: z.enum(['astm-c680', 'iso-12241']),
  specification: specificationTitleSchema,
});
export type JobInput = z.infer<typeof jobInputSchema>;

export const jobSchema = rowSchema.extend(jobInputSchema.shape);
export type Job = z.infer<typeof jobSchema>;

/** A job in the list: what is due, how far it is. */
export const jobSummarySchema = jobSchema
  .pick({ id: true, number: true, name: true, site: true, bidDue: true })
  .extend({ runs: z.number().int(), onHold: z.number().int(), lastRevision: z.string().nullable() });
export type JobSummary = z.infer<typeof jobSummarySchema>;
