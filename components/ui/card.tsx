import type { ReactNode } from 'react';
import { StyleSheet, View, type ViewProps } from 'react-native';

import { hairline, radius, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';

type CardProps = {
  children: ReactNode;
  /** selected or proposed: drawn in the accent */
  chosen?: boolean;
  /** no room inside: a list or a table brings its own */
  flush?: boolean;
  role?: ViewProps['role'];
  'aria-label'?: string;
};

/** A sheet of paper on the page. */
export function Card({ children, chosen = false, flush = false, ...rest }: CardProps) {
  const theme = useTheme();
  const colours = { backgroundColor: theme.sheet, borderColor: chosen ? theme.oxide : theme.rule };
  return (
    <View {...rest} style={[styles.card, colours, chosen && styles.chosen, !flush && styles.room]}>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  card: { borderWidth: hairline, borderRadius: radius.md, minWidth: 0, overflow: 'hidden' },
  chosen: { borderWidth: 2 },
  room: { padding: space.md, gap: space.sm },
});
