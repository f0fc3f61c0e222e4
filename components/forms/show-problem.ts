import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';

import { problemSchema, type Problem } from '@/api/contracts/problem';

type Target<Input extends FieldValues> = { setError: UseFormSetError<Input>; getValues: () => unknown };

/** Puts a failed request's messages beside their fields and the rest at the head of the form. What is no such failure is thrown on. */
export function showProblem<Input extends FieldValues>(error: unknown, { setError, getValues }: Target<Input>): void {
  const problem = problemOf(error);
  if (!problem) throw error;
  const fields = Object.entries(problem.fields ?? {});
  const paths = pathsOf(getValues());
  const known = fields.filter(([path]) => paths.includes(path));
  known.forEach(([path, message], index) => {
    if (isPath<Input>(path, paths)) setError(path, { type: 'server', message }, { shouldFocus: index === 0 });
  });
  const others = fields.filter(([path]) => !paths.includes(path)).map(([path, message]) => `${path}: ${message}`);
  setError('root', { type: 'server', message: [problem.detail ?? problem.title, ...others].join(' ') });
}

/** What a request's failure carries; undefined when it is another error. */
export function problemOf(error: unknown): Problem | undefined {
  return error instanceof Error && 'problem' in error ? problemSchema.safeParse(error.problem).data : undefined;
}

const isPath = <Input extends FieldValues>(path: string, paths: readonly string[]): path is FieldPath<Input> =>
  paths.includes(path);

/** Every path that a form's values have: `a`, `a.b`, `a.0.c`. */
function pathsOf(values: unknown, above = ''): string[] {
  if (typeof values !== 'object' || values === null) return [];
  return Object.entries(values).flatMap(([name, value]) => {
    const path = above ? `${above}.${name}` : name;
    return [path, ...pathsOf(value, path)];
  });
}
