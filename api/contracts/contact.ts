import { z } from 'zod';

import { emailSchema, line, optionalLine, rowSchema } from './text';

/** A client's person: enters only through a private link. */
export const contactInputSchema = z.object({
  name: line(120),
  company: optionalLine(160),
  email: emailSchema,
  role: optionalLine(120),
});
export const contactSchema = rowSchema.extend(contactInputSchema.shape);
export type Contact = z.infer<typeof contactSchema>;
export type ContactInput = z.infer<typeof contactInputSchema>;
