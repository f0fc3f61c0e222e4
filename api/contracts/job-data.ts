import { z } from 'zod';

import { addendumSchema, drawingSchema, levelSchema } from './basis';
import { buildUpSchema, specificationRowSchema } from './build-up';
import { contactSchema } from './contact';
import { jobSchema } from './job';
import { placeSchema } from './place';
import { runSchema } from './run';
import { serviceSchema } from './service';

/** All that a job holds, as entered: what judging, documents and revisions start from. */
export const jobDataSchema = z.object({
  job: jobSchema,
  levels: z.array(levelSchema),
  drawings: z.array(drawingSchema),
  addenda: z.array(addendumSchema),
  places: z.array(placeSchema),
  services: z.array(serviceSchema),
  buildUps: z.array(buildUpSchema),
  specification: z.array(specificationRowSchema),
  runs: z.array(runSchema),
  /** the job's own contacts, in its order */
  contacts: z.array(contactSchema),
});
export type JobData = z.infer<typeof jobDataSchema>;
