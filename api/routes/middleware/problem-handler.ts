import type { ErrorRequestHandler, Response } from 'express';

import { toAppError } from './app-error';

/** The one exit for everything that goes wrong: problem+json, never a stack trace. */
// eslint-disable-next-line max-params -- Express knows an error handler by its four parameters
export const problemHandler: ErrorRequestHandler = (error, request, response: Response, next) => {
  if (response.headersSent) return next(error);
  const problem = toAppError(error).toProblem();
  const reference = request.id === undefined ? undefined : String(request.id);
  if (problem.status >= 500) request.log?.error(error);
  if (problem.retryAfter !== undefined) response.setHeader('Retry-After', problem.retryAfter);
  response
    .status(problem.status)
    .type('application/problem+json')
    .set('Cache-Control', 'no-store')
    .json(problem.status >= 500 ? { ...problem, reference } : problem);
};
