import { StyleSheet } from 'react-native';

import { fieldTarget, fontFamily, hairline, radius, space, touchTarget, type, weight } from '@/components/theme/tokens';
import { useTheme, type Theme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';

/** action: the one thing to do here; quiet: everything else; plain: no frame; danger: what cannot be taken back. */
export type ButtonTone = 'action' | 'quiet' | 'plain' | 'danger';

export type ButtonProps = {
  label: string;
  /** left out for a button that submits its form */
  onPress?: () => void;
  tone?: ButtonTone;
  /** still at work: cannot be pressed again, keeps the focus */
  busy?: boolean;
  /** what stands on it meanwhile */
  busyLabel?: string;
  disabled?: boolean;
  submit?: boolean;
  /** the id of the form that it submits, when it stands outside of it */
  formId?: string;
  /** as wide as its place: a phone's one action */
  full?: boolean;
  /** for gloves: 56 high */
  large?: boolean;
  /** more for those who do not see what stands around it: "Remove level 3" where the label is "Remove" */
  name?: string;
};

export function Button({ label, onPress, tone = 'quiet', submit, formId, name, ...props }: ButtonProps) {
  const theme = useTheme();
  const { busy, busyLabel, disabled, full, large } = props;
  return (
    <Element
      tag="button"
      type={submit ? 'submit' : 'button'}
      form={formId}
      aria-label={name}
      aria-busy={busy}
      disabled={disabled}
      onClick={(event) => (busy ? event.preventDefault() : onPress?.())}
      style={[
        buttonShape.button,
        toneStyle(theme, tone),
        full && styles.full,
        large && styles.large,
        disabled && styles.dim,
      ]}
    >
      {(busy && busyLabel) || label}
    </Element>
  );
}

/** A link that looks like a button takes the same. */
export function toneStyle(theme: Theme, tone: ButtonTone) {
  if (tone === 'plain') return { backgroundColor: 'transparent', borderColor: 'transparent', color: theme.inkSoft };
  if (tone === 'quiet') return { backgroundColor: theme.sheet, borderColor: theme.rule, color: theme.ink };
  const fill = tone === 'action' ? theme.oxide : theme.fail;
  return { backgroundColor: fill, borderColor: fill, color: theme.onAction };
}

export const buttonShape = StyleSheet.create({
  button: webStyle({
    display: 'inline-flex',
    boxSizing: 'border-box',
    alignItems: 'center',
    justifyContent: 'center',
    minHeight: touchTarget,
    margin: 0,
    paddingTop: space.xs,
    paddingBottom: space.xs,
    paddingLeft: space.md,
    paddingRight: space.md,
    borderWidth: hairline,
    borderStyle: 'solid',
    borderRadius: radius.sm,
    fontFamily,
    fontSize: type.body.fontSize,
    lineHeight: `${type.body.lineHeight}px`,
    fontWeight: weight.strong,
    textAlign: 'center',
    textDecorationLine: 'none',
    cursor: 'pointer',
    flexShrink: 0,
  }),
});

const styles = StyleSheet.create({
  full: { alignSelf: 'stretch', flexGrow: 1 },
  large: { minHeight: fieldTarget, fontSize: type.lead.fontSize },
  dim: { opacity: 0.6 },
});
