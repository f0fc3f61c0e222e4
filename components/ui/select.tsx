import { useId, type Ref } from 'react';
import { StyleSheet, View } from 'react-native';

import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';
import { boxColours, described, Field, fieldShape, type FieldWords } from './field';

export type Option<Value extends string = string> = { value: Value; label: string; group?: string; disabled?: boolean };

export type SelectProps<Value extends string = string> = FieldWords & {
  value: Value | '';
  options: readonly Option<Value>[];
  onChange: (value: Value) => void;
  onBlur?: () => void;
  ref?: Ref<HTMLSelectElement>;
  name?: string;
  /** what stands there as long as nothing is chosen */
  placeholder?: string;
  optional?: boolean;
  disabled?: boolean;
};

/** The browser's own list: known to every keyboard, phone and screen reader. Values must differ. */
export function Select<Value extends string>({
  label,
  hideLabel,
  hint,
  problem,
  optional,
  ...control
}: SelectProps<Value>) {
  const theme = useTheme();
  const id = useId();
  const { options, placeholder, onChange, ...rest } = control;
  const choose = (value: string) => {
    const option = options.find((one) => one.value === value);
    if (option) onChange(option.value);
  };
  return (
    <Field id={id} label={label} hideLabel={hideLabel} hint={hint} problem={problem} optional={optional}>
      <View style={styles.place}>
        <Element
          tag="select"
          {...rest}
          {...described(id, { hint, problem })}
          id={id}
          onChange={(event) => choose(event.target.value)}
          style={[fieldShape.box, boxColours(theme, problem), styles.select]}
        >
          {rest.value === '' ? <option value="">{placeholder ?? 'Choose'}</option> : null}
          <Options options={options} />
        </Element>
        <View style={[styles.arrow, { borderTopColor: theme.inkSoft }]} />
      </View>
    </Field>
  );
}

/** Options in the order given; those that name a group stand together under its name. */
function Options({ options }: { options: readonly Option[] }) {
  const groups = [...new Set(options.map(({ group }) => group))];
  return groups.map((group) => {
    const list = options
      .filter((option) => option.group === group)
      .map(({ value, label, disabled }) => (
        <option key={value} value={value} disabled={disabled}>
          {label}
        </option>
      ));
    return group ? (
      <optgroup key={group} label={group}>
        {list}
      </optgroup>
    ) : (
      list
    );
  });
}

const styles = StyleSheet.create({
  place: { justifyContent: 'center' },
  select: webStyle({ paddingRight: space.xl, textOverflow: 'ellipsis', cursor: 'pointer' }),
  arrow: webStyle({
    position: 'absolute',
    right: space.sm,
    width: 0,
    height: 0,
    borderStyle: 'solid',
    borderTopWidth: 5,
    borderLeftWidth: 5,
    borderRightWidth: 5,
    borderBottomWidth: 0,
    borderLeftColor: 'transparent',
    borderRightColor: 'transparent',
    pointerEvents: 'none',
  }),
});
