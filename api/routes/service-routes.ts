import type { Router } from 'express';

import { serviceInputSchema } from '@/api/contracts/service';
import type { ServiceService } from '@/api/services/service-service';

import { jobRowRoutes } from './job-row-routes';

export const serviceRoutes = (service: ServiceService): Router =>
  jobRowRoutes({ path: 'services', input: serviceInputSchema, service });
