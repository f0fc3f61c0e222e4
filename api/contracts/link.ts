import { z } from 'zod';

import { flagSchema } from './judgement';
import { snapshotSchema } from './revision';

/** What a client sees through a private link: only what was sent to them. */
export const linkViewSchema = z.object({
  state: z.enum(['current', 'superseded', 'expired', 'revoked']),
  supersededBy: z.string().nullable(),
  contact: z.object({ name: z.string() }),
  pdfBytes: z.number().int().nullable(),
  /** null when expired or revoked */
  sent: snapshotSchema
    .pick({
      letter: true,
      frozenAt: true,
      validUntil: true,
      timeZone: true,
      preparedBy: true,
      letterhead: true,
      schedule: true,
      takeoff: true,
      cautions: true,
      method: true,
      engineVersion: true,
    })
    .extend({
      job: snapshotSchema.shape.job.pick({ number: true, name: true, site: true, scope: true, codeEdition: true }),
      flags: z.array(flagSchema.extend({ runNumber: z.string() })),
      conditions: z.array(z.object({ place: z.string(), words: z.array(z.string()) })),
    })
    .nullable(),
});
export type LinkView = z.infer<typeof linkViewSchema>;
