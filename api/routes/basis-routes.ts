import { Router } from 'express';

import { addendumInputSchema, drawingInputSchema, levelInputSchema } from '@/api/contracts/basis';
import type { BasisService } from '@/api/services/basis-service';

import { jobRowRoutes } from './job-row-routes';

export function basisRoutes({ levels, drawings, addenda }: BasisService): Router {
  return Router().use(
    jobRowRoutes({ path: 'levels', input: levelInputSchema, service: levels }),
    jobRowRoutes({ path: 'drawings', input: drawingInputSchema, service: drawings }),
    jobRowRoutes({ path: 'addenda', input: addendumInputSchema, service: addenda }),
  );
}
