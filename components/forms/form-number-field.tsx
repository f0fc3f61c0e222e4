import { useState } from 'react';
import type { FieldValues } from 'react-hook-form';

import { TextField, type TextFieldProps } from '@/components/ui/text-field';

import { useBound, type Bound } from './bound';

type Own = Pick<TextFieldProps, 'label' | 'hint' | 'unit' | 'optional' | 'disabled'>;
type FormNumberFieldProps<Input extends FieldValues, Output> = Bound<Input, Output> & Own & { whole?: boolean };

/** A plain number (a count, an emittance): no unit to convert. An empty field is `null`. */
export function FormNumberField<Input extends FieldValues, Output>(props: FormNumberFieldProps<Input, Output>) {
  const { control, name, whole = false, ...own } = props;
  const { ref, value, change, leave, problem } = useBound({ control, name });
  const [typed, setTyped] = useState<{ text: string; value: unknown }>();
  const type = (text: string) => {
    const next = numberOf(text);
    setTyped({ text, value: next });
    change(next);
  };
  // what was typed stays as typed, unless the form was given another value since
  const text = typed && Object.is(typed.value, value) ? typed.text : textOf(value);
  return (
    <TextField
      {...own}
      ref={ref}
      name={name}
      numeric
      inputMode={whole ? 'numeric' : 'decimal'}
      autoComplete="off"
      value={text}
      onChange={type}
      onBlur={leave}
      problem={problem}
    />
  );
}

const textOf = (value: unknown) => (typeof value === 'number' && !Number.isNaN(value) ? String(value) : '');

function numberOf(text: string): number | null {
  const plain = text.trim().replace('−', '-').replace(',', '.');
  return plain === '' ? null : Number(plain);
}
