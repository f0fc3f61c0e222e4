import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';

import { fieldProblem } from './field-problem';

/** What binds a field to its form. */
export type Bound<Input extends FieldValues, Output, Name extends FieldPath<Input> = FieldPath<Input>> = {
  control: Control<Input, unknown, Output>;
  name: Name;
};

/** The field's value, its handlers, and its problem in words. */
export function useBound<Input extends FieldValues, Output, Name extends FieldPath<Input>>({
  control,
  name,
}: Bound<Input, Output, Name>) {
  const { field, fieldState } = useController<Input, Name, Output>({ control, name });
  const { ref, value, onChange, onBlur } = field;
  return { ref, value, change: onChange, leave: onBlur, problem: fieldProblem(fieldState.error) };
}
