import type { RequestHandler } from 'express';

/** What opens without an account is not for search engines, and tells no other site where it stood. */
export const unlisted: RequestHandler = (_request, response, next) => {
  response.setHeader('X-Robots-Tag', 'noindex, nofollow, noarchive');
  response.setHeader('Referrer-Policy', 'no-referrer');
  response.setHeader('Cache-Control', 'no-store');
  next();
};
