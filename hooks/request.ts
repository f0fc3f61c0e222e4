import { mutate } from 'swr';
import { z } from 'zod';

import { problemSchema, type Problem } from '@/api/contracts/problem';

// The page's policy forbids eval, and each try would be reported as a breach.
z.config({ jitless: true });

/** A request that did not do what was asked; `problem` says why, in words for a person. */
export class RequestFailed extends Error {
  constructor(readonly problem: Problem) {
    super(problem.detail ?? problem.title);
    this.name = 'RequestFailed';
  }
}

export const sessionPath = '/session';
export type RequestOptions = {
  method?: 'GET' | 'POST' | 'PATCH' | 'PUT' | 'DELETE';
  body?: unknown;
  signal?: AbortSignal;
};

/**
 * The only fetch: a path below /api, and the shape that its answer must have.
 * @throws RequestFailed whatever went wrong: refused by the server, no network, or an answer of another shape
 */
export async function request<Shape>(
  path: string,
  schema: z.ZodType<Shape>,
  options: RequestOptions = {},
): Promise<Shape> {
  const response = await send(path, options);
  const answer = await read(response);
  if (!response.ok) {
    const problem = problemOf(answer, response.status);
    // The session ended under an open screen: asking for it again tells the gate.
    const asksForIt = path === sessionPath && (options.method ?? 'GET') === 'GET';
    if (problem.type === '/problems/sign-in' && !asksForIt) void mutate(sessionPath);
    throw new RequestFailed(problem);
  }
  const parsed = schema.safeParse(answer);
  if (!parsed.success) throw new RequestFailed(otherShape);
  return parsed.data;
}

function send(path: string, { method = 'GET', body, signal }: RequestOptions): Promise<Response> {
  const headers: Record<string, string> = { accept: 'application/json' };
  if (body !== undefined) headers['content-type'] = 'application/json';
  if (method !== 'GET') headers['x-thickset'] = '1';
  const sent = { method, headers, body: body === undefined ? null : JSON.stringify(body), signal };
  return fetch(`/api${path}`, sent).catch((error: unknown) => {
    if (signal?.aborted) throw error;
    throw new RequestFailed(offline);
  });
}

async function read(response: Response): Promise<unknown> {
  if (response.status === 204) return undefined;
  return response.json().catch(() => undefined);
}

function problemOf(answer: unknown, status: number): Problem {
  const parsed = problemSchema.safeParse(answer);
  return parsed.success ? parsed.data : { ...noAnswer, status };
}

const offline: Problem = {
  type: '/problems/offline',
  title: 'No connection',
  status: 0,
  detail: 'No connection. Nothing was lost: try again when it is back.',
};
const noAnswer: Problem = {
  type: '/problems/unavailable',
  title: 'Thickset does not answer',
  status: 503,
  detail: 'Thickset does not answer at this moment. Nothing was lost: try again in a minute.',
};
const otherShape: Problem = {
  type: '/problems/other-version',
  title: 'This page and the server are of different versions',
  status: 500,
  detail: 'The server answered in a way that this page does not know. Reload the page.',
};
