import { Router } from 'express';

import { workingAskedSchema } from '@/api/contracts/study';
import type { StudyService } from '@/api/services/study-service';

import { may } from './middleware/access';
import { memberOf } from './middleware/member';
import { idOf, parse } from './middleware/parse';

/** What follows from a job: flags, studies, schedule, takeoff. */
export function studyRoutes(studyService: StudyService): Router {
  const router = Router();
  router.get('/jobs/:job/judgement', may('see-jobs'), async (request, response) => {
    response.json(await studyService.judgement(memberOf(request), idOf(request, 'job')));
  });
  router.get('/jobs/:job/runs/:run/study', may('see-jobs'), async (request, response) => {
    response.json(await studyService.study(memberOf(request), idOf(request, 'job'), idOf(request, 'run')));
  });
  router.get('/jobs/:job/runs/:run/working', may('see-jobs'), async (request, response) => {
    const place = { job: idOf(request, 'job'), run: idOf(request, 'run') };
    const asked = parse(workingAskedSchema, request.query);
    response.json(await studyService.working(memberOf(request), place, asked));
  });
  router.get('/jobs/:job/schedule', may('see-jobs'), async (request, response) => {
    response.json(await studyService.schedule(memberOf(request), idOf(request, 'job')));
  });
  router.get('/jobs/:job/takeoff', may('see-jobs'), async (request, response) => {
    response.json(await studyService.takeoff(memberOf(request), idOf(request, 'job')));
  });
  return router;
}
