import { Router } from 'express';

import { open } from './middleware/access';

/** What must stand before requests can be answered. */
export type Readiness = { database: boolean; migrations: boolean; queue: boolean };

export function healthRoutes(readiness: () => Promise<Readiness>): Router {
  const router = Router();
  router.get('/health', open('for whoever watches the process'), (_request, response) => {
    response.json({ ok: true });
  });
  router.get('/ready', open('for whoever sends requests here'), async (_request, response) => {
    const parts = await readiness();
    const ready = Object.values(parts).every(Boolean);
    response.status(ready ? 200 : 503).json({ ready, ...parts });
  });
  return router;
}
