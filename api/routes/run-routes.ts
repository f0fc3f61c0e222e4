import { Router } from 'express';

import { runsPatchSchema } from '@/api/contracts/run';
import type { RunService } from '@/api/services/run-service';

import { may } from './middleware/access';
import { memberOf } from './middleware/member';
import { idOf, parse } from './middleware/parse';

export function runRoutes(runService: RunService): Router {
  const router = Router();
  router.get('/jobs/:job/runs', may('see-jobs'), async (request, response) => {
    response.json(await runService.list(memberOf(request), idOf(request, 'job')));
  });
  router.patch('/jobs/:job/runs', may('edit-jobs'), async (request, response) => {
    const batch = parse(runsPatchSchema, request.body);
    response.json(await runService.patch(memberOf(request), idOf(request, 'job'), batch));
  });
  return router;
}
