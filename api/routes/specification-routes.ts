import type { Router } from 'express';

import { specificationRowInputSchema } from '@/api/contracts/build-up';
import type { SpecificationService } from '@/api/services/specification-service';

import { jobRowRoutes } from './job-row-routes';

export const specificationRoutes = (service: SpecificationService): Router =>
  jobRowRoutes({ path: 'specification', input: specificationRowInputSchema, service });
