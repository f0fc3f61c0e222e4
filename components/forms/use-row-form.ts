import { useEffect, useState } from 'react';
import { useForm, useFormState, type DefaultValues, type FieldValues } from 'react-hook-form';
import type { z } from 'zod';

import { mergeEdits } from './merge-edits';
import { plainResolver } from './plain-resolver';
import { problemOf } from './show-problem';

type Seen = { id: string; version: number };

/** The row as another person saved it meanwhile, and what this form holds against it. */
export type Conflict<Output> = { theirs: Output; mine: Output };

type RowFormOptions<Input extends FieldValues, Output extends Input, Row extends Output & Seen> = {
  /** what is typed, and what is stored */
  schema: z.ZodType<Output, Input>;
  rowSchema: z.ZodType<Row>;
  /** null: a new one */
  row: Row | null;
  /** what the fields begin with */
  initial: DefaultValues<NoInfer<Input>>;
  actions: { create: (input: Output) => Promise<Row>; change: (seen: Seen, input: Output) => Promise<Row> };
  onSaved: (row: Row) => void;
};

/**
 * The form of one versioned row. A save names the version that it began from; when someone else was faster,
 * their changes are taken into the form where nothing was changed here, and the rest stands side by side.
 */
export function useRowForm<Input extends FieldValues, Output extends Input, Row extends Output & Seen>(
  options: RowFormOptions<Input, Output, Row>,
) {
  const { schema, rowSchema, row, initial, actions, onSaved } = options;
  const form = useForm<Input, unknown, Output>({ resolver: plainResolver(schema), defaultValues: initial });
  const [seen, setSeen] = useState(row);
  const [conflict, setConflict] = useState<Conflict<Output>>();
  const { isDirty } = useFormState({ control: form.control });
  const { reset } = form;

  // what others saved shows by itself, as long as nothing is typed here
  const [followed, setFollowed] = useState<Row>();
  if (row && seen && row.version > seen.version && !isDirty) {
    setSeen(row);
    setFollowed(row);
  }
  useEffect(() => {
    if (followed) reset(followed);
  }, [followed, reset]);

  const settle = (values: Output, current: unknown) => {
    const theirs = rowSchema.safeParse(current).data;
    if (!theirs || !seen) return;
    const mine = mergeEdits<Output>(seen, values, theirs);
    setSeen(theirs);
    setConflict({ theirs, mine });
    reset(mine, { keepDefaultValues: true });
  };
  const onSave = async (values: Output) => {
    try {
      const saved = seen ? await actions.change(seen, values) : await actions.create(values);
      setConflict(undefined);
      setSeen(saved);
      onSaved(saved);
    } catch (error) {
      const problem = problemOf(error);
      if (problem?.type === '/problems/stale') settle(values, problem.current);
      throw error;
    }
  };
  const takeTheirs = () => {
    if (!conflict) return;
    reset(conflict.theirs);
    setConflict(undefined);
  };
  return { form, onSave, conflict, takeTheirs };
}
export type RowEditing<Input extends FieldValues, Output extends Input> = Pick<
  ReturnType<typeof useRowForm<Input, Output, Output & Seen>>,
  'form' | 'onSave' | 'conflict' | 'takeTheirs'
>;
