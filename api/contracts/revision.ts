import { z } from 'zod';

import { flagSchema, judgedRunSchema } from './judgement';
import { addendumSchema, drawingSchema, levelSchema } from './basis';
import { jobSchema } from './job';
import { placeSchema } from './place';
import { runSchema } from './run';
import { scheduleSchema, takeoffSchema } from './schedule';
import { serviceSchema } from './service';
import { idSchema } from './text';

export const letterheadSchema = z.object({
  name: z.string(),
  town: z.string(),
  address: z.string(),
  email: z.string(),
  phone: z.string(),
  locale: z.string(),
  currency: z.string(),
});
export type Letterhead = z.infer<typeof letterheadSchema>;

/** A row of the library as it was used, with where it comes from. */
export const usedStandardSchema = z.object({
  id: z.string(),
  kind: z.enum(['pipe', 'material', 'finish', 'code', 'made-thickness', 'safety']),
  name: z.string(),
  detail: z.string(),
  source: z.string(),
  confidence: z.string(),
});
export type UsedStandard = z.infer<typeof usedStandardSchema>;

/** All that a document says; frozen with its revision, recomputed never. */
export const snapshotSchema = z.object({
  format: z.literal(1),
  letter: z.string().nullable(),
  frozenAt: z.iso.datetime().nullable(),
  validUntil: z.iso.date().nullable(),
  timeZone: z.string(),
  preparedBy: z.object({ name: z.string(), email: z.string() }),
  letterhead: letterheadSchema,
  to: z.array(z.object({ name: z.string(), company: z.string(), email: z.string() })),
  job: jobSchema,
  levels: z.array(levelSchema),
  drawings: z.array(drawingSchema),
  addenda: z.array(addendumSchema),
  places: z.array(placeSchema),
  services: z.array(serviceSchema),
  runs: z.array(runSchema),
  judged: z.array(judgedRunSchema),
  flags: z.array(flagSchema),
  schedule: scheduleSchema,
  takeoff: takeoffSchema,
  cautions: z.array(z.string()),
  standards: z.array(usedStandardSchema),
  engineVersion: z.string(),
  method: z.string(),
});
export type Snapshot = z.infer<typeof snapshotSchema>;

export const messageStates = ['waiting', 'sending', 'sent', 'perhaps-sent', 'refused', 'not-sent'] as const;
export type MessageState = (typeof messageStates)[number];

/** An outgoing e-mail to one contact, with that contact's own private link. */
export const messageSchema = z.object({
  id: idSchema,
  version: z.number().int(),
  revisionId: idSchema,
  contactId: idSchema,
  to: z.object({ name: z.string(), email: z.string() }),
  subject: z.string(),
  state: z.enum(messageStates),
  /** the server's own words, or why it waits */
  answer: z.string(),
  attempts: z.number().int(),
  createdAt: z.iso.datetime(),
  sentAt: z.iso.datetime().nullable(),
  messageId: z.string().nullable(),
  link: z
    .object({
      expiresAt: z.iso.datetime(),
      revokedAt: z.iso.datetime().nullable(),
      openings: z.number().int(),
      lastOpenedAt: z.iso.datetime().nullable(),
    })
    .nullable(),
});
export type Message = z.infer<typeof messageSchema>;

export const renderStates = ['waiting', 'ready', 'failed'] as const;
export const revisionSchema = z.object({
  id: idSchema,
  jobId: idSchema,
  letter: z.string(),
  frozenAt: z.iso.datetime(),
  frozenBy: z.string(),
  validUntil: z.iso.date(),
  rendering: z.enum(renderStates),
  /** sha-256 of the stored PDF */
  pdfHash: z.string().nullable(),
  pdfBytes: z.number().int().nullable(),
  supersededBy: z.string().nullable(),
  runs: z.number().int(),
  flags: z.number().int(),
  messages: z.array(messageSchema),
});
export type Revision = z.infer<typeof revisionSchema>;
