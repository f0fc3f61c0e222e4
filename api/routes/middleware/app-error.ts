import { z } from 'zod';

import type { ProblemType } from '@/api/contracts/problem';
import { EngineError } from '@/api/engine/engine-error';
import { AppError } from '@/api/errors';

import { messageOf } from './plain-words';

const thrownSchema = z.object({
  code: z.string().optional(),
  status: z.number().optional(),
  type: z.string().optional(),
});
type Thrown = z.infer<typeof thrownSchema>;

/** PostgreSQL's last word where a row slipped past the contract; the client learns the kind, the log the rest. */
const byCode: Record<string, ProblemType> = {
  '22001': 'invalid-input',
  '22003': 'invalid-input',
  '22021': 'invalid-input',
  '22P02': 'invalid-input',
  '22P05': 'invalid-input',
  '23502': 'invalid-input',
  '23514': 'invalid-input',
  '23503': 'not-found',
  '23505': 'conflict',
  '40001': 'conflict',
  '40P01': 'conflict',
  '42501': 'not-found',
  '53300': 'unavailable',
  '57P01': 'unavailable',
  '57P03': 'unavailable',
  ECONNREFUSED: 'unavailable',
  ECONNRESET: 'unavailable',
};

/** Names what went wrong; what nobody expected is `internal`, without a word of its own. */
export function toAppError(error: unknown): AppError {
  if (error instanceof AppError) return error;
  if (error instanceof z.ZodError) return toInvalidInput(error);
  if (error instanceof EngineError) {
    return new AppError(
      'cannot-calculate',
      error.message,
      error.field ? { fields: { [error.field]: error.message } } : {},
    );
  }
  const thrown = thrownSchema.safeParse(error);
  return (thrown.success && (fromDatabase(thrown.data) ?? fromExpress(thrown.data))) || new AppError('internal');
}

function fromDatabase({ code = '' }: Thrown): AppError | undefined {
  const type = byCode[code];
  return type && new AppError(type);
}

/** What Express and its parsers say about a request that they cannot read. */
function fromExpress({ status = 500, type }: Thrown): AppError | undefined {
  if (type === 'entity.too.large') return new AppError('too-large', 'At most 1 MB of JSON');
  if (type === 'entity.parse.failed') return new AppError('invalid-input', 'Malformed JSON');
  return status >= 400 && status < 500 ? new AppError('invalid-input', 'This request cannot be read') : undefined;
}

function toInvalidInput(error: z.ZodError): AppError {
  const fields: Record<string, string> = {};
  for (const issue of error.issues) fields[issue.path.join('.')] ??= messageOf(issue);
  const whole = fields[''];
  return new AppError('invalid-input', whole, { fields });
}
