import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';

import { AppError } from '@/api/errors';

/** So many failed requests from one network address; what succeeds is counted only when all are. */
export type Limit = { tries: number; minutes: number; counts?: 'failed' | 'all' };

export function limitByAddress({ tries, minutes, counts = 'failed' }: Limit): RequestHandler {
  return rateLimit({
    windowMs: minutes * 60_000,
    limit: tries,
    skipSuccessfulRequests: counts === 'failed',
    standardHeaders: false,
    legacyHeaders: false,
    handler: (_request, _response, next) =>
      next(
        new AppError(
          'too-many-tries',
          `Too many tries from your network. Try again in ${minutes} ${minutes === 1 ? 'minute' : 'minutes'}.`,
          {
            retryAfter: minutes * 60,
          },
        ),
      ),
  });
}
