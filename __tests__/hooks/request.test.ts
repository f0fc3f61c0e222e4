import { z } from 'zod';

import { request, RequestFailed } from '@/hooks/request';

import { fakeApi } from '../support/fake-api';

const jobSchema = z.object({ name: z.string() });
const failure = (promise: Promise<unknown>) =>
  promise.then(
    () => undefined,
    (error: unknown) => (error instanceof RequestFailed ? error : undefined),
  );

it('reads below /api and gives the parsed answer', async () => {
  const asked = fakeApi(() => ({ status: 200, body: { name: 'Ward block', extra: 1 } }));
  expect(await request('/jobs/1', jobSchema)).toEqual({ name: 'Ward block' });
  expect(asked).toMatchObject([{ path: '/api/jobs/1', method: 'GET' }]);
  expect(asked[0]?.headers).not.toHaveProperty('x-thickset');
});

it.each(['POST', 'PATCH', 'PUT', 'DELETE'] as const)(
  'says with a %s that it is ours, and sends JSON',
  async (method) => {
    const asked = fakeApi(() => ({ status: 204 }));
    await request('/jobs', z.undefined(), { method, body: { name: 'Ward block' } });
    expect(asked[0]?.headers).toMatchObject({ 'x-thickset': '1', 'content-type': 'application/json' });
    expect(asked[0]?.body).toEqual({ name: 'Ward block' });
  },
);

it('throws the problem that the server names, its fields included', async () => {
  const problem = {
    type: '/problems/invalid-input',
    title: 'Something is not filled in right',
    status: 400,
    fields: { name: 'Must be filled in' },
  };
  fakeApi(() => ({ status: 400, body: problem }));
  expect((await failure(request('/jobs', jobSchema)))?.problem).toEqual(problem);
});

it('says in plain words that the network is gone, and that nothing was lost', async () => {
  fakeApi(() => 'no network');
  const error = await failure(request('/jobs', jobSchema));
  expect(error?.problem).toMatchObject({ type: '/problems/offline', status: 0 });
  expect(error?.message).toBe('No connection. Nothing was lost: try again when it is back.');
});

it('takes a page of a proxy for no answer', async () => {
  fakeApi(() => ({ status: 502, body: '<html>Bad gateway</html>' }));
  expect((await failure(request('/jobs', jobSchema)))?.problem).toMatchObject({
    type: '/problems/unavailable',
    status: 502,
  });
});

it('refuses an answer of another shape instead of handing it on', async () => {
  fakeApi(() => ({ status: 200, body: { title: 'no name' } }));
  expect((await failure(request('/jobs', jobSchema)))?.problem.type).toBe('/problems/other-version');
});
