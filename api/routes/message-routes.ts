import { Router } from 'express';

import { settleInputSchema } from '@/api/contracts/sending';
import type { MessageService } from '@/api/services/message-service';

import { may } from './middleware/access';
import { memberOf } from './middleware/member';
import { idOf, parse } from './middleware/parse';

export function messageRoutes(messageService: MessageService): Router {
  const router = Router();
  router.post('/messages/:message/settle', may('send'), async (request, response) => {
    const input = parse(settleInputSchema, request.body);
    response.json(await messageService.settle(memberOf(request), idOf(request, 'message'), input));
  });
  router.post('/messages/:message/link-revocation', may('send'), async (request, response) => {
    response.json(await messageService.revokeLink(memberOf(request), idOf(request, 'message')));
  });
  return router;
}
