import type { FieldValues } from 'react-hook-form';

import { Select, type SelectProps } from '@/components/ui/select';

import { useBound, type Bound } from './bound';

type Own = Pick<SelectProps, 'label' | 'hideLabel' | 'hint' | 'options' | 'placeholder' | 'optional' | 'disabled'>;
type FormSelectProps<Input extends FieldValues, Output> = Bound<Input, Output> &
  Own & {
    /** what choosing nothing is called, where that is a choice; the form then holds `null` */
    none?: string;
    /** after the form has the new choice: to empty what depended on the old one */
    onChosen?: (value: string) => void;
  };

/** One of a list. */
export function FormSelect<Input extends FieldValues, Output>(props: FormSelectProps<Input, Output>) {
  const { control, name, none, options, onChosen, ...own } = props;
  const { ref, value, change, leave, problem } = useBound({ control, name });
  const choose = (chosen: string) => {
    change(chosen === noneValue ? null : chosen);
    onChosen?.(chosen);
  };
  const empty = none === undefined ? '' : noneValue;
  return (
    <Select
      {...own}
      ref={ref}
      name={name}
      options={none === undefined ? options : [{ value: noneValue, label: none }, ...options]}
      value={typeof value === 'string' && value !== '' ? value : empty}
      onChange={choose}
      onBlur={leave}
      problem={problem}
    />
  );
}

const noneValue = 'none-chosen';
