import express, { Router, type Express, type RequestHandler } from 'express';

import { AppError } from '@/api/errors';
import { basisRoutes } from '@/api/routes/basis-routes';
import { buildUpRoutes } from '@/api/routes/build-up-routes';
import { contactRoutes } from '@/api/routes/contact-routes';
import { healthRoutes, type Readiness } from '@/api/routes/health-routes';
import { jobRoutes } from '@/api/routes/job-routes';
import { libraryRoutes } from '@/api/routes/library-routes';
import { linkRoutes } from '@/api/routes/link-routes';
import { messageRoutes } from '@/api/routes/message-routes';
import { securityHeaders } from '@/api/routes/middleware/headers';
import type { Limit } from '@/api/routes/middleware/limit';
import { withMember } from '@/api/routes/middleware/member';
import { problemHandler } from '@/api/routes/middleware/problem-handler';
import { sameSite } from '@/api/routes/middleware/same-site';
import { webApp } from '@/api/routes/middleware/web-app';
import { placeRoutes } from '@/api/routes/place-routes';
import { revisionRoutes } from '@/api/routes/revision-routes';
import { runRoutes } from '@/api/routes/run-routes';
import { serviceRoutes } from '@/api/routes/service-routes';
import { sessionRoutes } from '@/api/routes/session-routes';
import { specificationRoutes } from '@/api/routes/specification-routes';
import { studyRoutes } from '@/api/routes/study-routes';
import type { Services } from '@/api/services/services';

export type AppParts = {
  session: RequestHandler;
  services: Services;
  readiness: () => Promise<Readiness>;
  signInLimit: Limit;
  publicUrl?: string;
  logger?: RequestHandler;
  /** folder of the exported web app */
  web?: string;
};

export function createApp({ session, services, readiness, signInLimit, publicUrl, logger, web }: AppParts): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', 'loopback');
  if (logger) app.use(logger);
  app.use(securityHeaders);
  app.use('/api', neverStored, healthRoutes(readiness));
  app.use('/api', sameSite(publicUrl), session, withMember(services.session), express.json({ limit: '1mb' }));
  app.use('/api', routes(services, signInLimit));
  app.use('/api', () => {
    throw new AppError('not-found');
  });
  if (web) app.use(webApp(web));
  app.use(problemHandler);
  return app;
}

/** Every route below /api, each with its whole path and its rule. */
function routes(services: Services, signInLimit: Limit): Router {
  const router = Router();
  router.use(sessionRoutes(services.session, signInLimit));
  router.use(jobRoutes(services.job), contactRoutes(services.contact), basisRoutes(services.basis));
  router.use(placeRoutes(services.place), serviceRoutes(services.service), buildUpRoutes(services.buildUp));
  router.use(specificationRoutes(services.specification), runRoutes(services.run), libraryRoutes(services.library));
  router.use(studyRoutes(services.study), revisionRoutes(services.revision));
  router.use(messageRoutes(services.message), linkRoutes(services.link));
  return router;
}

const neverStored: RequestHandler = (_request, response, next) => {
  response.setHeader('Cache-Control', 'no-store');
  next();
};
