import type { RequestHandler } from 'express';
import { randomUUID } from 'node:crypto';
import type { IncomingMessage } from 'node:http';
import { pino, type DestinationStream, type Logger } from 'pino';
import { pinoHttp } from 'pino-http';

const secrets = [
  'password',
  'passwordHash',
  'password_hash',
  'token',
  'code',
  'cookie',
  'authorization',
  '["set-cookie"]',
];
const below = (name: string, depth: number) =>
  '*'.repeat(depth).split('').join('.') + (name.startsWith('[') ? name : `.${name}`);

/** Whatever an object in the log calls a secret is left out, three levels deep. */
const redact = {
  paths: secrets.flatMap((name) => [name, below(name, 1), below(name, 2), below(name, 3)]),
  censor: '[left out]',
};

export const createLogger = (level: string, destination?: DestinationStream): Logger =>
  pino({ level, redact }, destination ?? pino.destination(1));

/** One line for each request: its id, what was asked, the answer, how long it took. No headers, no bodies. */
export function requestLogger(logger: Logger): RequestHandler {
  return pinoHttp({
    logger,
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    serializers: {
      req: ({ id, method, url }: { id: string; method: string; url: string }) => ({
        id,
        method,
        url: withoutTokens(url),
      }),
      res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
    },
    autoLogging: { ignore: (request: IncomingMessage) => request.url === '/api/health' },
    customLogLevel: (_request, response, error) => (error || response.statusCode >= 500 ? 'error' : 'info'),
  });
}

/** A private link's token opens a document: it must not stand in a log. */
export const withoutTokens = (url: string): string =>
  url.replace(/\/(links?|invitations|password-resets)\/[^/?#]+/g, '/$1/[left out]');
