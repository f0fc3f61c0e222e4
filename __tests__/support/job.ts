import type { z } from 'zod';

import { drawingSchema, levelSchema } from '@/api/contracts/basis';
import { jobSchema, type JobInput } from '@/api/contracts/job';
import { placeSchema } from '@/api/contracts/place';
import { serviceSchema } from '@/api/contracts/service';

import type { signedIn } from './firm';
import { drawingInput, jobInput, levelInput, placeInput, serviceInput } from './job-inputs';

export type Agent = Awaited<ReturnType<typeof signedIn>>;

/** Creates a row and reads the answer by its contract. */
export async function post<Row>(
  agent: Agent,
  path: string,
  { schema, input }: { schema: z.ZodType<Row>; input: object },
) {
  const { body } = await agent.post(path).send(input).expect(201);
  return schema.parse(body);
}

/** A job with one level, drawing, place and service, entered through the routes. */
export async function newJob(agent: Agent, input: Partial<JobInput> = {}) {
  const job = await post(agent, '/api/jobs', { schema: jobSchema, input: { ...jobInput, ...input } });
  const path = `/api/jobs/${job.id}`;
  const level = await post(agent, `${path}/levels`, { schema: levelSchema, input: levelInput });
  const drawing = await post(agent, `${path}/drawings`, { schema: drawingSchema, input: drawingInput });
  const place = await post(agent, `${path}/places`, { schema: placeSchema, input: placeInput });
  const service = await post(agent, `${path}/services`, { schema: serviceSchema, input: serviceInput });
  const where = { serviceId: service.id, placeId: place.id, levelId: level.id, drawingId: drawing.id };
  return { job, path, level, drawing, place, service, where };
}
export type TestJob = Awaited<ReturnType<typeof newJob>>;
