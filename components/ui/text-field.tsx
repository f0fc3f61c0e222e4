import { useId, type KeyboardEvent, type RefCallback } from 'react';
import { StyleSheet, View } from 'react-native';

import { space, touchTarget } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';
import { boxColours, described, Field, fieldShape, type FieldWords } from './field';
import { Text } from './text';

type Control = HTMLInputElement | HTMLTextAreaElement;

export type TextFieldProps = FieldWords & {
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  onKeyDown?: (event: KeyboardEvent<Control>) => void;
  ref?: RefCallback<Control>;
  name?: string;
  kind?: 'text' | 'email' | 'password' | 'date' | 'time' | 'search';
  /** which keyboard a phone shows */
  inputMode?: 'text' | 'decimal' | 'numeric' | 'email' | 'search';
  autoComplete?: string;
  placeholder?: string;
  /** so many lines high */
  multiline?: number;
  /** stands at the right, inside the box: a unit */
  unit?: string;
  /** figures, set to the right */
  numeric?: boolean;
  optional?: boolean;
  /** said to those who do not see the form; what is optional says so in its label */
  required?: boolean;
  disabled?: boolean;
  maxLength?: number;
};

export function TextField({ label, hideLabel, hint, problem, optional, unit, ...control }: TextFieldProps) {
  const id = useId();
  return (
    <Field id={id} label={label} hideLabel={hideLabel} hint={hint} problem={problem} optional={optional}>
      <View style={styles.place}>
        <Box id={id} hint={hint} problem={problem} unit={unit} {...control} />
        {unit ? (
          <View style={styles.unit}>
            <Text id={`${id}-unit`} tone="inkSoft">
              {unit}
            </Text>
          </View>
        ) : null}
      </View>
    </Field>
  );
}

type BoxProps = Omit<TextFieldProps, 'label' | 'optional'> & { id: string };

function Box({
  id,
  hint,
  problem,
  unit,
  kind = 'text',
  multiline,
  numeric,
  required,
  ref,
  onChange,
  ...rest
}: BoxProps) {
  const theme = useTheme();
  const words = described(id, { hint, problem });
  const shared = {
    ...rest,
    ...words,
    id,
    'aria-required': required,
    // the unit is read after the label, so that it is known before the number is typed
    'aria-describedby': [unit && `${id}-unit`, words['aria-describedby']].filter(Boolean).join(' ') || undefined,
    onChange: (event: { target: Control }) => onChange(event.target.value),
    style: [
      fieldShape.box,
      boxColours(theme, problem),
      numeric && styles.numeric,
      unit ? { paddingRight: unitRoom(unit) } : null,
    ],
  };
  if (multiline) return <Element tag="textarea" rows={multiline} ref={ref} {...shared} />;
  return <Element tag="input" type={kind} ref={ref} {...shared} />;
}

/** Room for the unit, by the length of its words. */
const unitRoom = (unit: string) => space.sm + space.xs + Math.ceil(unit.length * 7.5);

const styles = StyleSheet.create({
  place: { justifyContent: 'center' },
  numeric: webStyle({ textAlign: 'right', fontVariantNumeric: 'tabular-nums' }),
  unit: webStyle({
    position: 'absolute',
    right: space.sm,
    height: touchTarget,
    justifyContent: 'center',
    pointerEvents: 'none',
  }),
});
