import { z } from 'zod';

const oneLine = /^[^\p{Cc}\p{Zl}\p{Zp}]*$/u;
const manyLines = /^[^\p{Cc}]*$/u;

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
export const idSchema = z.uuid('Not a known id');
export const dateSchema = z.iso.date('Must be a date');

/** Every stored row: an edit names the version it saw. */
export const rowSchema = z.object({ id: idSchema, version: z.number().int().positive() });
/** What an edit names: the version it saw. */
export const seenSchema = z.object({ version: z.number().int().positive() });
