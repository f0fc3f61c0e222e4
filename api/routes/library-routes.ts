import { Router } from 'express';

import type { LibraryService } from '@/api/services/library-service';

import { may } from './middleware/access';

/** The library, part by part, by its name in the address. */
export function libraryRoutes(library: LibraryService): Router {
  const parts = {
    'pipe-sizes': library.pipeSizes,
    materials: library.materials,
    finishes: library.finishes,
    series: library.series,
    codes: library.codes,
    safety: library.safety,
  };
  const router = Router();
  for (const [name, part] of Object.entries(parts)) {
    router.get(`/library/${name}`, may('see-jobs'), (_request, response) => {
      response.json(part());
    });
  }
  return router;
}
