import type { Request } from 'express';
import { z } from 'zod';

import { AppError } from '@/api/errors';

/** @throws ZodError, which the problem handler turns into a message for each field */
export function parse<Shape>(schema: z.ZodType<Shape>, value: unknown): Shape {
  if (value === undefined) throw new AppError('invalid-input', 'Send JSON');
  return schema.parse(value);
}

/** An id in the path: what cannot be an id is an id that nobody has. */
export function idOf(request: Request, name = 'id'): string {
  const id = z.uuid().toLowerCase().safeParse(request.params[name]);
  if (!id.success) throw new AppError('not-found');
  return id.data;
}
