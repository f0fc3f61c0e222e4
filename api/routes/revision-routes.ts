import { Router } from 'express';

import { sendInputSchema } from '@/api/contracts/sending';
import type { Services } from '@/api/services/services';

import { may } from './middleware/access';
import { memberOf } from './middleware/member';
import { idOf, parse } from './middleware/parse';
import { sendPdf } from './middleware/send-pdf';

export function revisionRoutes(revisionService: Services['revision']): Router {
  const router = Router();
  router.get('/jobs/:job/draft.pdf', may('see-jobs'), async (request, response) => {
    sendPdf(response, await revisionService.draft(memberOf(request), idOf(request, 'job')), 'inline');
  });
  router.get('/jobs/:job/revisions', may('see-jobs'), async (request, response) => {
    response.json(await revisionService.list(memberOf(request), idOf(request, 'job')));
  });
  router.post('/jobs/:job/revisions', may('revise'), async (request, response) => {
    response.status(201).json(await revisionService.freeze(memberOf(request), idOf(request, 'job')));
  });
  router.get('/revisions/:revision', may('see-jobs'), async (request, response) => {
    response.json(await revisionService.get(memberOf(request), idOf(request, 'revision')));
  });
  router.get('/revisions/:revision/pdf', may('see-jobs'), async (request, response) => {
    const file = await revisionService.pdf(memberOf(request), idOf(request, 'revision'));
    response.setHeader('Cache-Control', 'private, no-cache');
    sendPdf(response, file, 'attachment');
  });
  router.post('/revisions/:revision/mail-preview', may('revise'), async (request, response) => {
    const input = parse(sendInputSchema, request.body);
    response.json(await revisionService.preview(memberOf(request), idOf(request, 'revision'), input));
  });
  router.post('/revisions/:revision/messages', may('send'), async (request, response) => {
    const input = parse(sendInputSchema, request.body);
    response.status(202).json(await revisionService.send(memberOf(request), idOf(request, 'revision'), input));
  });
  return router;
}
