import type { FieldValues } from 'react-hook-form';

import { Segmented, type SegmentedProps } from '@/components/ui/segmented';

import { useBound, type Bound } from './bound';

type FormSegmentedProps<Input extends FieldValues, Output> = Bound<Input, Output> &
  Pick<SegmentedProps, 'label' | 'hint' | 'segments'> & { onChosen?: (value: string) => void };

/** One of a few, all in sight. */
export function FormSegmented<Input extends FieldValues, Output>(props: FormSegmentedProps<Input, Output>) {
  const { control, name, onChosen, ...own } = props;
  const { value, change, leave, problem } = useBound({ control, name });
  const choose = (chosen: string) => {
    change(chosen);
    onChosen?.(chosen);
  };
  return <Segmented {...own} value={String(value ?? '')} onChange={choose} onBlur={leave} problem={problem} />;
}
