import { z } from 'zod';

import { roles } from './permission';
import { unitSystems } from './quantities';
import { emailSchema, idSchema, line } from './text';

// bcrypt reads 72 bytes and stops at a zero byte: what it would not see is refused.
const bytesOf = (text: string) => new TextEncoder().encode(text).length;
const seenByHash = z
  .string({ error: 'Must be text' })
  .refine((text) => bytesOf(text) <= 72, { error: 'At most 72 bytes' })
  .refine((text) => !text.includes('\0'), { error: 'Holds a character that cannot be used' });

export const signInSchema = z.object({
  email: z.string({ error: 'Must be text' }).trim().pipe(emailSchema),
  password: seenByHash.refine((text) => text.length > 0, { error: 'Must be filled in' }),
});
export type SignIn = z.infer<typeof signInSchema>;

export const newPasswordSchema = seenByHash.refine((text) => text.length >= 12, { error: 'At least 12 characters' });

export const memberSchema = z.object({
  accountId: idSchema,
  firmId: idSchema,
  name: z.string(),
  email: z.string(),
  role: z.enum(roles),
  maySend: z.boolean(),
  seesMargin: z.boolean(),
  units: z.enum(unitSystems),
});
/** One of a firm's people, as the services know who asks. */
export type Member = z.infer<typeof memberSchema>;

export const memberInputSchema = z.object({
  name: line(120),
  email: emailSchema,
  role: z.enum(roles),
  maySend: z.boolean(),
  seesMargin: z.boolean(),
  password: newPasswordSchema,
});
export type MemberInput = z.infer<typeof memberInputSchema>;

export const firmInputSchema = z.object({
  name: line(120),
  town: z.string().trim().max(120),
  address: z.string().trim().max(400),
  email: z.string().trim().max(254),
  phone: z.string().trim().max(60),
  currency: z.string().regex(/^[A-Z]{3}$/, 'Must be a currency code like EUR'),
  locale: z.string().min(2).max(35),
  paper: z.enum(['A4', 'Letter']),
  timeZone: z.string().min(1).max(60),
  units: z.enum(unitSystems),
  quotePrefix: z.string().trim().max(12),
  quoteValidDays: z.number().int().min(1).max(365),
  recordAddress: z.string().trim().max(254),
});
export type FirmInput = z.infer<typeof firmInputSchema>;
export const firmSchema = firmInputSchema.extend({ id: idSchema });
export type Firm = z.infer<typeof firmSchema>;

/** What the client knows about the person who is signed in. */
export const sessionSchema = z.object({
  member: memberSchema.omit({ firmId: true }),
  firm: firmSchema.pick({
    id: true,
    name: true,
    town: true,
    currency: true,
    locale: true,
    paper: true,
    timeZone: true,
  }),
});
export type Session = z.infer<typeof sessionSchema>;

export const sessionChangeSchema = z.object({ units: z.enum(unitSystems) });
export type SessionChange = z.infer<typeof sessionChangeSchema>;
