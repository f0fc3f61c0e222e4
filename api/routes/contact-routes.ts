import { Router } from 'express';
import { z } from 'zod';

import { contactInputSchema } from '@/api/contracts/contact';
import { seenSchema } from '@/api/contracts/text';
import type { ContactService } from '@/api/services/contact-service';

import { seenInQuerySchema } from './job-row-routes';
import { may } from './middleware/access';
import { memberOf } from './middleware/member';
import { idOf, parse } from './middleware/parse';

const changedSchema = z.object({ ...contactInputSchema.shape, ...seenSchema.shape });

export function contactRoutes(contactService: ContactService): Router {
  const router = Router();
  router.get('/contacts', may('see-jobs'), async (request, response) => {
    response.json(await contactService.list(memberOf(request)));
  });
  router.post('/contacts', may('edit-jobs'), async (request, response) => {
    const input = parse(contactInputSchema, request.body);
    response.status(201).json(await contactService.create(memberOf(request), input));
  });
  router.patch('/contacts/:contact', may('edit-jobs'), async (request, response) => {
    const { version, ...input } = parse(changedSchema, request.body);
    const seen = { id: idOf(request, 'contact'), version };
    response.json(await contactService.change(memberOf(request), seen, input));
  });
  router.delete('/contacts/:contact', may('edit-jobs'), async (request, response) => {
    const seen = { id: idOf(request, 'contact'), ...parse(seenInQuerySchema, request.query) };
    await contactService.remove(memberOf(request), seen);
    response.status(204).end();
  });
  return router;
}
