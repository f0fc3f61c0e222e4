import { z } from 'zod';

const messageSchema = z.object({ message: z.string().min(1) });
const branchSchema = z.record(z.string(), z.unknown());

/** The first message of a field's error: of the field itself, else of a part of it (`length.value`). */
export function fieldProblem(error: unknown, depth = 0): string | undefined {
  const own = messageSchema.safeParse(error);
  if (own.success) return own.data.message;
  const branch = branchSchema.safeParse(error);
  if (!branch.success || depth > 3) return undefined;
  return Object.entries(branch.data)
    .filter(([part]) => part !== 'ref')
    .map(([, below]) => fieldProblem(below, depth + 1))
    .find((message) => message !== undefined);
}
