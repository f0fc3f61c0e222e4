import type { ReactNode } from 'react';
import { StyleSheet, View, type ViewProps } from 'react-native';

import { hairline, space, type Space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

type BoxProps = { children: ReactNode; gap?: Space; role?: ViewProps['role']; 'aria-label'?: string };
type Align = 'start' | 'center' | 'end' | 'stretch' | 'baseline';

const aligns = {
  start: 'flex-start',
  center: 'center',
  end: 'flex-end',
  stretch: 'stretch',
  baseline: 'baseline',
} as const;

/** One below the other. */
export function Stack({
  children,
  gap = 'md',
  align = 'stretch',
  grow,
  ...rest
}: BoxProps & { align?: Align; grow?: boolean }) {
  return (
    <View {...rest} style={[styles.stack, grow && styles.grow, { gap: space[gap], alignItems: aligns[align] }]}>
      {children}
    </View>
  );
}

type RowProps = BoxProps & { align?: Align; spread?: boolean; wrap?: boolean };

/** Side by side, on further lines when they do not fit; `spread` pushes the ends apart. */
export function Row({ children, gap = 'xs', align = 'center', spread = false, wrap = true, ...rest }: RowProps) {
  return (
    <View
      {...rest}
      style={[styles.row, wrap && styles.wrap, { gap: space[gap], alignItems: aligns[align] }, spread && styles.spread]}
    >
      {children}
    </View>
  );
}

/** As many equal columns as fit, none narrower than `column`. */
export function Grid({ children, gap = 'md', column = 280, ...rest }: BoxProps & { column?: number }) {
  const columns = webStyle({ gridTemplateColumns: `repeat(auto-fill, minmax(min(${column}px, 100%), 1fr))` });
  return (
    <View {...rest} style={[styles.grid, columns, { gap: space[gap] }]}>
      {children}
    </View>
  );
}

/** A hairline between two parts. */
export function Rule() {
  const theme = useTheme();
  return <View style={[styles.rule, { backgroundColor: theme.rule }]} />;
}

const styles = StyleSheet.create({
  stack: { flexDirection: 'column', minWidth: 0 },
  grow: { flexGrow: 1, flexShrink: 1, flexBasis: 0 },
  row: { flexDirection: 'row', minWidth: 0 },
  wrap: { flexWrap: 'wrap' },
  spread: { justifyContent: 'space-between' },
  grid: webStyle({ display: 'grid', alignItems: 'stretch' }),
  rule: { height: hairline, alignSelf: 'stretch' },
});
