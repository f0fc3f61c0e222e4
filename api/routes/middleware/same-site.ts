import type { Request, RequestHandler } from 'express';

import { AppError } from '@/api/errors';

const reads = ['GET', 'HEAD', 'OPTIONS'];

/**
 * Refuses a write that another site made the browser send: a form cannot set `X-Thickset`, a script of
 * another origin may not, and a browser that names the origin must name ours.
 */
export function sameSite(publicUrl?: string): RequestHandler {
  const publicHost = publicUrl && new URL(publicUrl).host;
  return (request, _response, next) => {
    if (!reads.includes(request.method) && !isOurs(request, publicHost)) throw new AppError('cross-site');
    next();
  };
}

function isOurs(request: Request, publicHost?: string): boolean {
  if (request.get('x-thickset') !== '1') return false;
  const site = request.get('sec-fetch-site');
  if (site !== undefined && site !== 'same-origin' && site !== 'none') return false;
  const origin = request.get('origin');
  if (origin === undefined) return true;
  const host = URL.canParse(origin) ? new URL(origin).host : '';
  return host !== '' && (host === request.get('host') || host === publicHost);
}
