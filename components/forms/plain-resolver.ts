import { zodResolver } from '@hookform/resolvers/zod';
import type { FieldValues, Resolver } from 'react-hook-form';
import type { z } from 'zod';

type Issue = { code: string; input?: unknown; expected?: unknown };

const kinds: Record<string, string> = {
  number: 'Must be a number',
  int: 'Must be a whole number',
  string: 'Must be text',
  boolean: 'Must be yes or no',
};

/** Where the contract has no sentence of its own, plain words instead of the library's. */
export function plainWords({ code, input, expected }: Issue): string | undefined {
  if (input === undefined || input === null || input === '') return 'Must be filled in';
  if (code === 'invalid_type') return kinds[String(expected)] ?? 'Is not right';
  if (code === 'invalid_value') return 'Must be one of the list';
  if (code === 'invalid_union') return 'Is not right';
  return undefined;
}

/** A contract, as what a form is checked against. */
export const plainResolver = <Input extends FieldValues, Output>(
  schema: z.ZodType<Output, Input>,
): Resolver<Input, unknown, Output> => zodResolver(schema, { error: plainWords });
