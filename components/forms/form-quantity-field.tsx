import { useState } from 'react';
import type { FieldValues } from 'react-hook-form';

import {
  editText,
  readQuantity,
  unitLabel,
  type Quantity,
  type QuantityKind,
  type UnitSystem,
} from '@/api/contracts/quantities';
import { TextField, type TextFieldProps } from '@/components/ui/text-field';

import { useBound, type Bound } from './bound';
import { useFieldUnits } from './field-units';

type Own = Pick<TextFieldProps, 'label' | 'hideLabel' | 'hint' | 'optional' | 'disabled'>;
type FormQuantityFieldProps<Input extends FieldValues, Output> = Bound<Input, Output> &
  Own & {
    kind: QuantityKind;
    /** the field may stay empty, which the form holds as `null`; without it the contract wants a number */
    blank?: null;
  };

/** What is being typed, the value that it gave to the form, and why it cannot be read. */
type Draft = { text: string; value: unknown; problem?: string };

/**
 * A number with its unit: the form holds the value in SI and what was typed for it.
 * "150 ft" and "2 in" are read in any units; switching units shows the same value, which never changes by it.
 */
export function FormQuantityField<Input extends FieldValues, Output>(props: FormQuantityFieldProps<Input, Output>) {
  const { control, name, kind, blank, ...own } = props;
  const units = useFieldUnits();
  const { ref, value, change, leave, problem } = useBound({ control, name });
  const [draft, setDraft] = useState<Draft>();
  const [typing, setTyping] = useState(false);
  // a draft counts as long as the form was not given another value since
  const live = draft && isSame(draft.value, value) ? draft : undefined;
  const quantity = quantityOf(value);
  const type = (text: string) => {
    const next = read({ kind, text, units });
    setTyping(true);
    setDraft(next);
    change(next.value);
  };
  const settle = () => {
    setTyping(false);
    if (live && !live.problem) setDraft(undefined);
    leave();
  };
  return (
    <TextField
      {...own}
      ref={ref}
      name={name}
      required={blank !== null}
      numeric
      inputMode="text"
      autoComplete="off"
      unit={unitLabel(kind, units)}
      value={live ? live.text : editText(kind, quantity, units)}
      hint={hintOf({ hint: own.hint, kind, quantity, units })}
      onChange={type}
      // Enter saves without leaving the field: what is wrong with it must be seen
      onKeyDown={({ key }) => (key === 'Enter' ? setTyping(false) : undefined)}
      onBlur={settle}
      problem={typing ? undefined : (live?.problem ?? problem)}
    />
  );
}

// the form keeps a copy of what it is given
const isSame = (one: unknown, other: unknown) => JSON.stringify(one) === JSON.stringify(other);

type Typed = { kind: QuantityKind; text: string; units: UnitSystem };

function read({ kind, text, units }: Typed): Draft {
  if (text.trim() === '') return { text, value: null };
  const reading = readQuantity(kind, text, units);
  if ('quantity' in reading) return { text, value: reading.quantity };
  // kept in the form as what no contract takes, so that it cannot be saved by mistake
  return { text, value: { value: NaN }, problem: reading.problem };
}

type Hinted = { hint?: string; kind: QuantityKind; quantity?: Quantity; units: UnitSystem };

/** Where something was typed in another unit, it is said beside the hint. */
function hintOf({ hint, kind, quantity, units }: Hinted): string | undefined {
  const typed = quantity?.typed;
  if (!typed || typed.unit === unitLabel(kind, units)) return hint;
  return [hint, `Typed as ${typed.text} ${typed.unit}`].filter(Boolean).join(' · ');
}

function quantityOf(value: unknown): Quantity | undefined {
  if (typeof value !== 'object' || value === null || !('value' in value)) return undefined;
  if (typeof value.value !== 'number' || Number.isNaN(value.value)) return undefined;
  return { value: value.value, typed: 'typed' in value ? typedOf(value.typed) : undefined };
}

function typedOf(typed: unknown): Quantity['typed'] {
  if (typeof typed !== 'object' || typed === null || !('text' in typed) || !('unit' in typed)) return undefined;
  return { text: String(typed.text), unit: String(typed.unit) };
}
