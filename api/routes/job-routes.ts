import { Router } from 'express';
import { z } from 'zod';

import { jobInputSchema } from '@/api/contracts/job';
import { seenSchema } from '@/api/contracts/text';
import type { JobService } from '@/api/services/job-service';

import { may } from './middleware/access';
import { memberOf } from './middleware/member';
import { idOf, parse } from './middleware/parse';

const changedSchema = z.object({ ...jobInputSchema.shape, ...seenSchema.shape });

export function jobRoutes(jobService: JobService): Router {
  const router = Router();
  router.get('/jobs', may('see-jobs'), async (request, response) => {
    response.json(await jobService.list(memberOf(request)));
  });
  router.post('/jobs', may('edit-jobs'), async (request, response) => {
    const input = parse(jobInputSchema, request.body);
    response.status(201).json(await jobService.create(memberOf(request), input));
  });
  router.get('/jobs/:job', may('see-jobs'), async (request, response) => {
    response.json(await jobService.get(memberOf(request), idOf(request, 'job')));
  });
  router.patch('/jobs/:job', may('edit-jobs'), async (request, response) => {
    const { version, ...input } = parse(changedSchema, request.body);
    const seen = { id: idOf(request, 'job'), version };
    response.json(await jobService.change(memberOf(request), seen, input));
  });
  return router;
}
