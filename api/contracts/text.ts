import { z } from 'zod';

// half of a surrogate pair (Cs) is no character: PostgreSQL refuses it, and nothing can print it
const oneLine = /^[^\p{Cc}\p{Cs}\p{Zl}\p{Zp}]*$/u;
const manyLines = /^[^\p{Cc}\p{Cs}]*$/u;

const upTo = (max: number) => z.string({ error: 'Must be text' }).trim().max(max, `At most ${max} characters`);

/** One line that must be filled in. */
export const line = (max = 120) => upTo(max).min(1, 'Must be filled in').regex(oneLine, 'Must be one line');
/** One line that may be empty. */
export const optionalLine = (max = 120) => upTo(max).regex(oneLine, 'Must be one line');
/** Several lines, may be empty. */
export const paragraph = (max = 2000) =>
  upTo(max).refine((text) => manyLines.test(text.replace(/[\n\r\t]/g, ' ')), {
    error: 'Holds characters that cannot be printed',
  });

export const emailSchema = z.email('Must be an e-mail address').max(254, 'At most 254 characters');
export const idSchema = z.uuid('Not a known id').toLowerCase();
export const dateSchema = z.iso
  .date('Must be a date')
  .refine((date) => date >= '1900' && date < '2200', { error: 'Must be between 1900 and 2199' });

/** Every stored row: an edit names the version it saw. */
export const rowSchema = z.object({ id: idSchema, version: z.number().int().positive() });
/** What an edit names: the version it saw. */
export const seenSchema = z.object({ version: z.number().int().positive() });
