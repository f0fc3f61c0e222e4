import type { FieldValues } from 'react-hook-form';

import { Checkbox, type CheckboxProps } from '@/components/ui/checkbox';

import { useBound, type Bound } from './bound';

type FormCheckboxProps<Input extends FieldValues, Output> = Bound<Input, Output> &
  Pick<CheckboxProps, 'label' | 'hint' | 'disabled'>;

/** Yes or no. */
export function FormCheckbox<Input extends FieldValues, Output>(props: FormCheckboxProps<Input, Output>) {
  const { control, name, ...own } = props;
  const { ref, value, change, leave, problem } = useBound({ control, name });
  return (
    <Checkbox
      {...own}
      ref={ref}
      name={name}
      checked={value === true}
      onChange={change}
      onBlur={leave}
      problem={problem}
    />
  );
}
