import express from 'express';
import { Writable } from 'node:stream';
import request from 'supertest';

import { createLogger, requestLogger } from '@/api/logger';

function listen() {
  const lines: string[] = [];
  const destination = new Writable({
    write(chunk, _encoding, done) {
      lines.push(String(chunk));
      done();
    },
  });
  return { lines, logger: createLogger('info', destination) };
}

async function logged(
  ask: (app: express.Express) => request.Test,
): Promise<{ answer: request.Response; text: string }> {
  const { lines, logger } = listen();
  const app = express();
  app.use(requestLogger(logger));
  app.use((_request, response) => {
    response.cookie('thickset', 'cookie-of-the-answer').json({ ok: true });
  });
  const answer = await ask(app);
  return { answer, text: lines.join('') };
}

it('gives each request an id, in the log and in the answer', async () => {
  const { answer, text } = await logged((app) => request(app).get('/api/jobs?sort=name'));
  const line = JSON.parse(text);
  expect(line.req).toEqual({ id: answer.headers['x-request-id'], method: 'GET', url: '/api/jobs?sort=name' });
  expect(line.req.id).toMatch(/^[0-9a-f-]{36}$/);
  expect(line.res).toEqual({ statusCode: 200 });
});

it('keeps cookies, credentials and bodies out', async () => {
  const { text } = await logged((app) =>
    request(app)
      .post('/api/session')
      .set({ Cookie: 'thickset=cookie-of-the-request', Authorization: 'Bearer of-a-token' })
      .send({ email: 'a@b.example', password: 'of-the-body' }),
  );
  expect(text).toContain('/api/session');
  expect(text).not.toMatch(/cookie-of|of-a-token|of-the-body|a@b\.example/);
});

it.each([
  '/api/links/S3cretT0ken',
  '/api/links/S3cretT0ken/pdf?download=1',
  '/links/S3cretT0ken',
  '/link/S3cretT0ken',
  '/api/invitations/S3cretT0ken',
  '/api/password-resets/S3cretT0ken',
])('keeps the token out of %s', async (url) => {
  const { text } = await logged((app) => request(app).get(url));
  expect(text).toContain('[left out]');
  expect(text).not.toContain('S3cretT0ken');
});

it('leaves out what an object calls a secret, however deep', () => {
  const { lines, logger } = listen();
  logger.info({ password: 'p-1', member: { passwordHash: 'p-2', account: { token: 'p-3', name: 'Olive' } } }, 'member');
  logger.error({ err: Object.assign(new Error('no'), { headers: { cookie: 'p-4', 'set-cookie': 'p-5' } }) }, 'failed');
  expect(lines.join('')).toContain('Olive');
  expect(lines.join('')).not.toMatch(/p-\d/);
});
