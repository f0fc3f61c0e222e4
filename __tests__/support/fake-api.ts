/** One answer of a server that is not there: a status and a body, or no answer at all. */
export type FakeAnswer = { status: number; body?: unknown } | 'no network';
export type Asked = { path: string; method: string; headers: Record<string, string>; body: unknown };
type Init = { method?: string; headers?: Record<string, string>; body?: string | null };

/** Puts a server in the place of `fetch`, which a test's document does not have; what it was asked is noted in order. */
export function fakeApi(answer: (asked: Asked) => FakeAnswer): Asked[] {
  const asked: Asked[] = [];
  const fetch = async (path: string, { method = 'GET', headers = {}, body }: Init = {}) => {
    const one = { path, method, headers, body: body ? JSON.parse(body) : undefined };
    asked.push(one);
    const given = answer(one);
    if (given === 'no network') throw new TypeError('Failed to fetch');
    return { ok: given.status < 400, status: given.status, json: async () => parsed(given.body) };
  };
  Object.defineProperty(globalThis, 'fetch', { value: fetch, configurable: true, writable: true });
  return asked;
}

/** A body that is no JSON (a proxy's page) is given as a string. */
function parsed(body: unknown): unknown {
  if (typeof body === 'string') throw new SyntaxError('Unexpected token');
  return body;
}
