import type { FieldValues, UseFormReturn } from 'react-hook-form';

import { showProblem } from './show-problem';

export type Saved<Input extends FieldValues, Output> = {
  form: UseFormReturn<Input, unknown, Output>;
  /** writes; a failure is shown in the form, which keeps what was typed */
  onSave: (values: Output) => Promise<unknown>;
};

/** Returns a function that checks, saves, and then counts what is there as saved. */
export function useSaving<Input extends FieldValues, Output>({ form, onSave }: Saved<Input, Output>) {
  const { handleSubmit, reset, getValues, setError } = form;
  return handleSubmit(async (values) => {
    try {
      await onSave(values);
      reset(getValues());
    } catch (error) {
      showProblem(error, { setError, getValues });
    }
  });
}
