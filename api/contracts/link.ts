import { z } from 'zod';

import { snapshotSchema } from './revision';
import { wordsSchema } from './study';

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
      /** numbered and grouped as in the document */
      clarifications: z.array(
        z.object({
          number: z.number().int(),
          title: z.string(),
          entries: z.array(z.object({ runs: z.string(), words: wordsSchema })),
        }),
      ),
      conditions: z.array(z.object({ place: z.string(), words: z.array(z.string()) })),
    })
    .nullable(),
});
export type LinkView = z.infer<typeof linkViewSchema>;
