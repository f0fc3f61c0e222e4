import { useFormState, type Control, type FieldValues } from 'react-hook-form';

import { Notice } from '@/components/ui/notice';

type FormProblemProps<Input extends FieldValues, Output> = { control: Control<Input, unknown, Output> };

/** What went wrong with the whole form; what was typed is still there. */
export function FormProblem<Input extends FieldValues, Output>({ control }: FormProblemProps<Input, Output>) {
  const { errors } = useFormState({ control });
  const message = errors.root?.message;
  if (!message) return null;
  return (
    <Notice tone="fail" title="Not saved" urgent>
      {message}
    </Notice>
  );
}
