import type { FieldValues } from 'react-hook-form';

import { TextField, type TextFieldProps } from '@/components/ui/text-field';

import { useBound, type Bound } from './bound';

type Own = Omit<TextFieldProps, 'value' | 'onChange' | 'onBlur' | 'ref' | 'name' | 'problem'>;
type FormTextFieldProps<Input extends FieldValues, Output> = Bound<Input, Output> &
  Own & {
    /** what an empty field means to the contract: `null` for a date that is not known */
    blank?: null;
  };

/** A text of the form. */
export function FormTextField<Input extends FieldValues, Output>(props: FormTextFieldProps<Input, Output>) {
  const { control, name, blank, ...own } = props;
  const { ref, value, change, leave, problem } = useBound({ control, name });
  return (
    <TextField
      {...own}
      ref={ref}
      name={name}
      value={textOf(value)}
      onChange={(text) => change(text === '' && blank === null ? null : text)}
      onBlur={leave}
      problem={problem}
    />
  );
}

const textOf = (value: unknown) => (value === null || value === undefined ? '' : String(value));
