import { StyleSheet, View } from 'react-native';

import type { StripLayout } from '@/api/geometry/strip';
import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Text } from '@/components/ui/text';

/** Left of the strip on a wide screen: the scale of the plot, and what the quiet row is in. */
export const gutters = { SI: 52, IP: 84 } as const;

type StripAxisProps = { layout: StripLayout; width: number; unit: string; heatUnit: string };

export function StripAxis({ layout, width, unit, heatUnit }: StripAxisProps) {
  return (
    <View aria-hidden style={[styles.axis, { width }]}>
      <View style={[styles.tick, { top: 0 }]}>
        <Text size="small" tone="inkSoft">
          {unit}
        </Text>
      </View>
      {layout.ticks
        .filter(({ y }) => y > layout.top + 4)
        .map(({ value, y }) => (
          <View key={value} style={[styles.tick, { top: y - 9 }]}>
            <Text size="small" tone="inkSoft" numeric>
              {`${value}`.replace('-', '−')}
            </Text>
          </View>
        ))}
      <View style={[styles.tick, { top: layout.base + space.xs + 22 }]}>
        <Text size="small" tone="inkSoft" align="right">
          {heatUnit}
        </Text>
      </View>
    </View>
  );
}

export type NamedLevel = { id: string; text: string; top: number; end: 'left' | 'right' };

/** Names of the levels, over whatever part of the strip is in view. */
export function LevelNames({ levels }: { levels: readonly NamedLevel[] }) {
  const theme = useTheme();
  return levels.map(({ id, text, top, end }) => (
    <View key={id} aria-hidden style={[styles.name, styles[end], { top }]}>
      <View style={{ backgroundColor: theme.paper, opacity: 0.86 }}>
        <Text size="small" tone="fail" weight="strong" noWrap>
          {text}
        </Text>
      </View>
    </View>
  ));
}

const styles = StyleSheet.create({
  axis: webStyle({ position: 'absolute', left: 0, top: 0, pointerEvents: 'none' }),
  tick: { position: 'absolute', right: space.xs },
  name: webStyle({ position: 'absolute', pointerEvents: 'none', paddingLeft: space.xxs, paddingRight: space.xxs }),
  left: { left: space.sm },
  right: { right: 0 },
});
