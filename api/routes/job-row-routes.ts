import { Router } from 'express';
import { z } from 'zod';

import { seenSchema } from '@/api/contracts/text';
import type { JobRowService } from '@/api/services/job-rows';

import { may } from './middleware/access';
import { memberOf } from './middleware/member';
import { idOf, parse } from './middleware/parse';

type JobRowRoutes<Input, Row> = { path: string; input: z.ZodType<Input>; service: JobRowService<Input, Row> };

/** In a query a number is text. */
export const seenInQuerySchema = z.object({ version: z.coerce.number().pipe(seenSchema.shape.version) });

/** List, create, change and remove one noun of a job. */
export function jobRowRoutes<Input, Row>({ path, input, service }: JobRowRoutes<Input, Row>): Router {
  const router = Router();
  const list = `/jobs/:job/${path}`;
  const changed = z.intersection(input, seenSchema);
  router.get(list, may('see-jobs'), async (request, response) => {
    response.json(await service.list(memberOf(request), idOf(request, 'job')));
  });
  router.post(list, may('edit-jobs'), async (request, response) => {
    const row = parse(input, request.body);
    response.status(201).json(await service.create(memberOf(request), idOf(request, 'job'), row));
  });
  router.patch(`${list}/:id`, may('edit-jobs'), async (request, response) => {
    const place = { job: idOf(request, 'job'), id: idOf(request) };
    response.json(await service.change(memberOf(request), place, parse(changed, request.body)));
  });
  router.delete(`${list}/:id`, may('edit-jobs'), async (request, response) => {
    const seen = { id: idOf(request), ...parse(seenInQuerySchema, request.query) };
    await service.remove(memberOf(request), idOf(request, 'job'), seen);
    response.status(204).end();
  });
  return router;
}
