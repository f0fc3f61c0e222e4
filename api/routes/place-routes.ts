import type { Router } from 'express';

import { placeInputSchema } from '@/api/contracts/place';
import type { PlaceService } from '@/api/services/place-service';

import { jobRowRoutes } from './job-row-routes';

export const placeRoutes = (service: PlaceService): Router =>
  jobRowRoutes({ path: 'places', input: placeInputSchema, service });
