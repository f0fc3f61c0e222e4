import { z } from 'zod';

/** Every way in which a request can fail, with its HTTP status and what a person reads. */
export const problems = {
  'invalid-input': { title: 'Something is not filled in right', status: 400 },
  'sign-in': { title: 'Sign in first', status: 401 },
  'wrong-password': { title: 'E-mail and password do not match', status: 401 },
  'not-allowed': { title: 'You may not do this', status: 403 },
  'cross-site': { title: 'This request did not come from Thickset itself', status: 403 },
  'not-found': { title: 'Not found', status: 404 },
  stale: { title: 'Somebody else changed this first', status: 409 },
  conflict: { title: 'This does not go together with what is stored', status: 409 },
  gone: { title: 'No longer available', status: 410 },
  'too-large': { title: 'Too large', status: 413 },
  'cannot-calculate': { title: 'This case cannot be calculated', status: 422 },
  'too-many-tries': { title: 'Too many tries', status: 429 },
  internal: { title: 'Something went wrong on our side', status: 500 },
  unavailable: { title: 'Not available at this moment', status: 503 },
} as const satisfies Record<string, { title: string; status: number }>;
export type ProblemType = keyof typeof problems;

/** RFC 9457 problem+json; the last four members are ours. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  detail: z.string().optional(),
  /** one message for each field that is not right, by its path: `places.0.air` */
  fields: z.record(z.string(), z.string()).optional(),
  /** of a stale edit: the rows as they are now */
  current: z.unknown().optional(),
  /** seconds to wait before another try */
  retryAfter: z.number().optional(),
  /** names the request in the log */
  reference: z.string().optional(),
});
export type Problem = z.infer<typeof problemSchema>;
