import { Router } from 'express';

import { sessionChangeSchema, signInSchema } from '@/api/contracts/session';
import type { SessionService } from '@/api/services/session-service';

import { may, open } from './middleware/access';
import { limitByAddress, type Limit } from './middleware/limit';
import { memberOf } from './middleware/member';
import { parse } from './middleware/parse';
import { beginSession, endSession } from './middleware/session';

export function sessionRoutes(sessionService: SessionService, signInLimit: Limit): Router {
  const router = Router();
  router.post('/session', open('to sign in'), limitByAddress(signInLimit), async (request, response) => {
    await beginSession(request, await sessionService.signIn(parse(signInSchema, request.body)));
    response.status(204).end();
  });
  router.get('/session', may('own-account'), async (request, response) => {
    response.json(await sessionService.session(memberOf(request)));
  });
  router.patch('/session', may('own-account'), async (request, response) => {
    response.json(await sessionService.change(memberOf(request), parse(sessionChangeSchema, request.body)));
  });
  router.delete('/session', may('own-account'), async (request, response) => {
    await endSession(request, response);
    response.status(204).end();
  });
  return router;
}
