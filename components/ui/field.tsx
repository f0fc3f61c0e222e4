import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { fontFamily, hairline, radius, space, touchTarget, type, weight } from '@/components/theme/tokens';
import { useTheme, type Theme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';
import { Text } from './text';

/** What every field has: a label always, a hint where one helps, and what is wrong with it. */
export type FieldWords = {
  label: string;
  /** the label is read, not drawn: the head of a column says it */
  hideLabel?: boolean;
  hint?: string;
  problem?: string;
};

type FieldProps = FieldWords & { id: string; optional?: boolean; children: ReactNode };

/** Label above, the control, then hint and problem, which `described` ties to the control. */
export function Field({ id, label, hideLabel, hint, problem, optional, children }: FieldProps) {
  const theme = useTheme();
  return (
    <View style={styles.field}>
      <Element tag="label" htmlFor={id} style={[styles.label, { color: theme.ink }, hideLabel && styles.said]}>
        {label}
        {optional ? (
          <Element tag="span" style={[styles.optional, { color: theme.inkSoft }]}>
            {' (optional)'}
          </Element>
        ) : null}
      </Element>
      {children}
      {hint ? (
        <Text id={`${id}-hint`} size="small" tone="inkSoft">
          {hint}
        </Text>
      ) : null}
      {problem ? <ProblemText id={`${id}-problem`} text={problem} /> : null}
    </View>
  );
}

export function ProblemText({ id, text }: { id?: string; text: string }) {
  return (
    <Text id={id} size="small" tone="fail" weight="strong" role="alert">
      {text}
    </Text>
  );
}

/** What ties a control to its hint and its problem. */
export const described = (id: string, { hint, problem }: Pick<FieldWords, 'hint' | 'problem'>) => ({
  'aria-describedby': [hint && `${id}-hint`, problem && `${id}-problem`].filter(Boolean).join(' ') || undefined,
  'aria-invalid': problem ? true : undefined,
});

/** The box of a control, in the theme's colours. */
export const boxColours = (theme: Theme, problem?: string) => ({
  backgroundColor: theme.sheet,
  color: theme.ink,
  borderColor: problem ? theme.fail : theme.inkSoft,
});

export const fieldShape = StyleSheet.create({
  box: webStyle({
    boxSizing: 'border-box',
    width: '100%',
    minWidth: 0,
    minHeight: touchTarget,
    margin: 0,
    paddingTop: space.xs,
    paddingBottom: space.xs,
    paddingLeft: space.sm,
    paddingRight: space.sm,
    borderWidth: hairline,
    borderStyle: 'solid',
    borderRadius: radius.sm,
    fontFamily,
    // under 16 px a phone zooms in on what is being typed
    fontSize: type.lead.fontSize,
    lineHeight: `${type.lead.lineHeight}px`,
    appearance: 'none',
  }),
});

const styles = StyleSheet.create({
  field: { gap: space.xxs, minWidth: 0 },
  label: { fontFamily, ...type.body, fontWeight: weight.strong },
  optional: { fontWeight: weight.regular },
  said: webStyle({ position: 'absolute', width: 1, height: 1, overflow: 'hidden', clipPath: 'inset(50%)' }),
});
