import type { ReactNode } from 'react';
import { StyleSheet, Text as NativeText } from 'react-native';

import { fontFamily, type, weight, type TypeSize } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';

type Level = 1 | 2 | 3 | 4;
type HeadingProps = { children: ReactNode; level?: Level; size?: TypeSize; id?: string };

const sizes: Record<Level, TypeSize> = { 1: 'title', 2: 'lead', 3: 'body', 4: 'body' };

/** A screen has one of level 1, which Screen writes; parts of it begin at level 2. */
export function Heading({ children, level = 2, size = sizes[level], id }: HeadingProps) {
  const theme = useTheme();
  return (
    <NativeText role="heading" aria-level={level} id={id} style={[styles.heading, type[size], { color: theme.ink }]}>
      {children}
    </NativeText>
  );
}

const styles = StyleSheet.create({ heading: { fontFamily, fontWeight: weight.strong, margin: 0 } });
