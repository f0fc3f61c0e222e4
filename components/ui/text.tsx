import type { ReactNode } from 'react';
import { StyleSheet, Text as NativeText, type TextProps as NativeTextProps } from 'react-native';

import {
  fontFamily,
  type,
  weight as weights,
  type ColourName,
  type TypeSize,
  type Weight,
} from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

export type TextProps = {
  children: ReactNode;
  /** small 13, body 15, lead 17, sentence 21, title 28, figure 40 */
  size?: TypeSize;
  tone?: ColourName;
  weight?: Weight;
  /** figures of one width, so that columns line up */
  numeric?: boolean;
  align?: 'left' | 'center' | 'right';
  /** cut off after so many lines */
  lines?: number;
  /** keeps a number and its unit on one line */
  noWrap?: boolean;
  id?: string;
  /** a sign that repeats what words beside it say */
  decorative?: boolean;
  role?: NativeTextProps['role'];
  'aria-live'?: NativeTextProps['aria-live'];
};

export function Text({ children, size, tone, weight, numeric, align, lines, noWrap, decorative, ...rest }: TextProps) {
  const theme = useTheme();
  return (
    <NativeText
      {...rest}
      aria-hidden={decorative}
      numberOfLines={lines}
      style={[
        styles.text,
        type[size ?? 'body'],
        { color: theme[tone ?? 'ink'], fontWeight: weights[weight ?? 'regular'] },
        numeric && styles.numeric,
        align && { textAlign: align },
        noWrap && styles.noWrap,
      ]}
    >
      {children}
    </NativeText>
  );
}

const styles = StyleSheet.create({
  text: { fontFamily },
  numeric: { fontVariant: ['tabular-nums'] },
  noWrap: webStyle({ whiteSpace: 'nowrap' }),
});

type WordsProps = Pick<TextProps, 'children' | 'tone' | 'weight' | 'numeric' | 'noWrap' | 'decorative'>;

/** Words inside a Text that differ from it: they take size and colour from around them unless told. */
export function Words({ children, tone, weight, numeric, noWrap, decorative }: WordsProps) {
  const theme = useTheme();
  return (
    <NativeText
      aria-hidden={decorative}
      style={[
        tone && { color: theme[tone] },
        weight && { fontWeight: weights[weight] },
        numeric && styles.numeric,
        noWrap && styles.noWrap,
      ]}
    >
      {children}
    </NativeText>
  );
}
