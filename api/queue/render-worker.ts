import type PgBoss from 'pg-boss';
import type { Logger } from 'pino';

import type { RenderingService } from '@/api/services/rendering-service';

import { workOn } from './work';

type Parts = { boss: PgBoss; logger: Logger; rendering: RenderingService };

/** Makes the PDF of each frozen revision; one that fails is tried again, later and later. */
export const workOnRendering = ({ boss, logger, rendering }: Parts): Promise<string> =>
  workOn({ boss, logger, name: 'render', handle: (job) => rendering.render(job) });
