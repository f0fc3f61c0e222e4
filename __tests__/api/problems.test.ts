import express from 'express';
import request from 'supertest';
import { z } from 'zod';

import { problemSchema } from '@/api/contracts/problem';
import { EngineError } from '@/api/engine/engine-error';
import { AppError } from '@/api/errors';
import { problemHandler } from '@/api/routes/middleware/problem-handler';

import { newFirm, signedIn } from '../support/firm';
import { startStack, type Stack } from '../support/stack';

let stack: Stack;
beforeAll(async () => {
  stack = await startStack();
});
afterAll(() => stack.stop());

/** What a route answers that throws this. */
async function thrown(error: unknown) {
  const app = express();
  app.get('/', () => {
    throw error;
  });
  app.use(problemHandler);
  const answer = await request(app)
    .get('/')
    .expect('content-type', /^application\/problem\+json/);
  expect(answer.status).toBe(problemSchema.parse(answer.body).status);
  return answer;
}

describe('what is thrown', () => {
  it('is a problem of its own type, with the rows as they are now', async () => {
    const { body } = await thrown(new AppError('stale', undefined, { current: [{ id: 'a', version: 2 }] }));
    expect(body).toEqual({
      type: '/problems/stale',
      title: 'Somebody else changed this first',
      status: 409,
      current: [{ id: 'a', version: 2 }],
    });
  });

  it('has a message for each field, in plain words', async () => {
    const schema = z.object({
      runs: z.array(z.object({ length: z.number().positive(), kind: z.enum(['pipe', 'duct']) })),
      name: z.string().max(3),
      id: z.uuid(),
    });
    const given = {
      runs: [
        { length: 'long', kind: 'pipe' },
        { length: 0, kind: 'tank' },
      ],
      name: 'much too long',
      id: '7',
    };
    const { body } = await thrown(schema.safeParse(given).error);
    expect(body.status).toBe(400);
    expect(body.fields).toEqual({
      'runs.0.length': 'Must be a number',
      'runs.1.length': 'Must be more than 0',
      'runs.1.kind': 'Must be one of pipe, duct',
      name: 'At most 3 characters',
      id: 'Must be a known id',
    });
  });

  it('names the case that the engine cannot answer, at its field', async () => {
    const { body } = await thrown(new EngineError('Emittance must be in (0, 1], got 0', 'emittance'));
    expect(body).toMatchObject({ type: '/problems/cannot-calculate', status: 422 });
    expect(body.fields).toEqual({ emittance: 'Emittance must be in (0, 1], got 0' });
  });

  it.each([
    ['23505', 409],
    ['23503', 404],
    ['42501', 404],
    ['22P02', 400],
    ['22021', 400],
    ['57P01', 503],
    ['ECONNREFUSED', 503],
  ])('from PostgreSQL as %s becomes %i, without its words', async (code, status) => {
    const answer = await thrown(Object.assign(new Error('duplicate key "accounts_email" at 10.0.0.7'), { code }));
    expect(answer.status).toBe(status);
    expect(answer.text).not.toMatch(/accounts_email|10\.0\.0\.7/);
  });

  it.each([[new Error('secret at /srv/app.ts:1')], [new TypeError('x is not a function')], ['just text']])(
    'unexpectedly (%s) says nothing of itself',
    async (error) => {
      const answer = await thrown(error);
      expect(answer.body).toEqual({
        type: '/problems/internal',
        title: 'Something went wrong on our side',
        status: 500,
      });
      expect(answer.text).not.toMatch(/secret|app\.ts|not a function|at /);
    },
  );
});

describe('a request that cannot be read', () => {
  const post = (path: string) => request(stack.app).post(path).set('X-Thickset', '1').type('json');

  it('as 10 MB of JSON is 413, signed in or not', async () => {
    const tenMegabytes = JSON.stringify({ email: 'a@b.example', password: 'x'.repeat(10_000_000) });
    const answer = await post('/api/session').send(tenMegabytes).expect(413);
    expect(answer.body).toMatchObject({ type: '/problems/too-large', detail: 'At most 1 MB of JSON' });
    const agent = await signedIn(stack, await newFirm(stack.services));
    await agent.patch('/api/session').type('json').send(tenMegabytes).expect(413);
  });

  it.each([
    ['half an object', '{"email":'],
    ['no JSON', 'email=a'],
    ['a bare word', 'true'],
    ['a list', '[]'],
    ['null', 'null'],
  ])('as %s is 400, never 500', async (_case, body) => {
    const answer = await post('/api/session').send(body).expect(400);
    expect(answer.body.type).toBe('/problems/invalid-input');
    expect(answer.text).not.toMatch(/SyntaxError|node_modules/);
  });

  it('without a body, or as a form, asks for JSON', async () => {
    const bare = () => request(stack.app).post('/api/session').set('X-Thickset', '1');
    expect((await bare().expect(400)).body.detail).toBe('Send JSON');
    expect((await bare().type('form').send({ email: 'a@b.example' }).expect(400)).body.detail).toBe('Send JSON');
  });

  it('in a charset or an encoding that nobody knows is 400', async () => {
    await post('/api/session').set('Content-Encoding', 'rot13').send('{}').expect(400);
    await request(stack.app)
      .post('/api/session')
      .set('X-Thickset', '1')
      .set('Content-Type', 'application/json; charset=rot13')
      .send('{}')
      .expect(400);
  });

  it('leads nowhere as 404 below /api, with any method', async () => {
    await request(stack.app)
      .get('/api/nowhere')
      .expect(404)
      .expect('content-type', /problem\+json/);
    await post('/api/nowhere').send('{}').expect(404);
    await request(stack.app).get('/api/%E0%A4%A').expect(404);
  });
});

it('sets the headers that keep a page to itself', async () => {
  const { headers } = await request(stack.app).get('/api/health').expect(200, { ok: true });
  expect(headers['content-security-policy']).toContain("script-src 'self'");
  expect(headers['content-security-policy']).not.toMatch(/script-src[^;]*unsafe/);
  expect(headers).toMatchObject({
    'x-content-type-options': 'nosniff',
    'referrer-policy': 'no-referrer',
    'cache-control': 'no-store',
    'cross-origin-opener-policy': 'same-origin',
  });
  expect(headers['x-powered-by']).toBeUndefined();
});

describe('readiness', () => {
  it('stands on database, migrations and queue', async () => {
    const ready = { ready: true, database: true, migrations: true, queue: true };
    await request(stack.app).get('/api/ready').expect(200, ready);
  });

  it('is 503 when a part is missing', async () => {
    const without = await startStack({ readiness: async () => ({ database: true, migrations: false, queue: true }) });
    await request(without.app).get('/api/ready').expect(503);
    await without.stop();
  });
});
