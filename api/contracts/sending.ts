import { z } from 'zod';

import { idSchema, line, paragraph } from './text';

/** What a person writes before a revision goes out: to whom, subject, covering words. */
export const sendInputSchema = z.object({
  contactIds: z.array(idSchema).min(1, 'Choose at least one recipient').max(20, 'At most 20 recipients'),
  subject: line(200),
  words: paragraph(4000),
  /** true: a contact who has this revision already gets it once more, deliberately */
  again: z.boolean().optional(),
});
export type SendInput = z.infer<typeof sendInputSchema>;

/** How the mail would read, before it is sent. */
export const mailPreviewSchema = z.object({ subject: z.string(), text: z.string(), html: z.string() });
export type MailPreview = z.infer<typeof mailPreviewSchema>;

/** A person settles a message that was perhaps sent. */
export const settleInputSchema = z.object({
  as: z.enum(['sent', 'send-again', 'not-sent']),
  version: z.number().int().positive(),
});
export type SettleInput = z.infer<typeof settleInputSchema>;
