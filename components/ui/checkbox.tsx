import { useId, type Ref } from 'react';
import { StyleSheet, View } from 'react-native';

import { fontFamily, radius, space, touchTarget, type } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';
import { described, ProblemText, type FieldWords } from './field';
import { Text } from './text';

export type CheckboxProps = Omit<FieldWords, 'hideLabel'> & {
  checked: boolean;
  onChange: (checked: boolean) => void;
  onBlur?: () => void;
  ref?: Ref<HTMLInputElement>;
  name?: string;
  disabled?: boolean;
};

/** The whole line can be pressed, not the box alone. */
export function Checkbox({ label, hint, problem, checked, onChange, ...control }: CheckboxProps) {
  const theme = useTheme();
  const id = useId();
  const box = { borderColor: problem ? theme.fail : theme.inkSoft, backgroundColor: theme.sheet };
  return (
    <View style={styles.field}>
      <Element tag="label" htmlFor={id} style={styles.line}>
        <View style={styles.place}>
          <Element
            tag="input"
            type="checkbox"
            {...control}
            {...described(id, { hint, problem })}
            id={id}
            checked={checked}
            onChange={(event) => onChange(event.target.checked)}
            style={[styles.box, box, checked && { backgroundColor: theme.oxide, borderColor: theme.oxide }]}
          />
          {checked ? <View style={[styles.tick, { borderColor: theme.onAction }]} /> : null}
        </View>
        <Element tag="span" style={[styles.words, { color: theme.ink }]}>
          {label}
        </Element>
      </Element>
      {hint ? (
        <View style={styles.below}>
          <Text id={`${id}-hint`} size="small" tone="inkSoft">
            {hint}
          </Text>
        </View>
      ) : null}
      {problem ? <ProblemText id={`${id}-problem`} text={problem} /> : null}
    </View>
  );
}

const side = 24;
const styles = StyleSheet.create({
  field: { minWidth: 0 },
  line: webStyle({
    display: 'flex',
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    minHeight: touchTarget,
    cursor: 'pointer',
  }),
  place: { width: side, height: side, flexShrink: 0 },
  box: webStyle({
    boxSizing: 'border-box',
    width: side,
    height: side,
    margin: 0,
    borderWidth: 2,
    borderStyle: 'solid',
    borderRadius: radius.sm,
    appearance: 'none',
    cursor: 'pointer',
  }),
  tick: webStyle({
    position: 'absolute',
    left: 8.5,
    top: 4,
    width: 7,
    height: 12,
    borderStyle: 'solid',
    borderTopWidth: 0,
    borderLeftWidth: 0,
    borderRightWidth: 2,
    borderBottomWidth: 2,
    transform: 'rotate(42deg)',
    pointerEvents: 'none',
  }),
  words: { fontFamily, ...type.body },
  below: { paddingLeft: side + space.sm },
});
