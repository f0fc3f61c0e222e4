import type { Router } from 'express';

import { buildUpInputSchema } from '@/api/contracts/build-up';
import type { BuildUpService } from '@/api/services/build-up-service';

import { jobRowRoutes } from './job-row-routes';

export const buildUpRoutes = (service: BuildUpService): Router =>
  jobRowRoutes({ path: 'build-ups', input: buildUpInputSchema, service });
