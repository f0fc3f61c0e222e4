import { Link, type Href } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { radius, space, touchTarget } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Text } from '@/components/ui/text';

export type Place = { label: string; href: Href; current: boolean; count?: number };

// A link that hands its place to its child spreads the child's style, which must be one object.
/** A place on the rail. */
export function RailItem({ label, href, current, count }: Place) {
  const theme = useTheme();
  const colours = current ? { backgroundColor: theme.sheet, borderLeftColor: theme.oxide } : null;
  return (
    <Link href={href} asChild aria-current={current ? 'page' : undefined} aria-label={nameOf(label, count)}>
      <View style={StyleSheet.flatten([styles.rail, colours])}>
        <Text weight={current ? 'strong' : 'regular'}>{label}</Text>
        {count ? (
          <Text tone="fail" numeric>
            {count}
          </Text>
        ) : null}
      </View>
    </Link>
  );
}

/** A place on the bar at the foot of a phone. */
export function BarItem({ label, href, current, count }: Place) {
  const theme = useTheme();
  return (
    <Link href={href} asChild aria-current={current ? 'page' : undefined} aria-label={nameOf(label, count)}>
      <View style={StyleSheet.flatten([barItem.item, { borderTopColor: current ? theme.oxide : 'transparent' }])}>
        <Text size="small" weight={current ? 'strong' : 'regular'} tone={current ? 'ink' : 'inkSoft'} noWrap>
          {label}
        </Text>
        {count ? (
          <Text size="small" tone="fail" numeric>
            {count}
          </Text>
        ) : null}
      </View>
    </Link>
  );
}

const nameOf = (label: string, count?: number) => (count ? `${label}, ${count}` : undefined);

export const barItem = StyleSheet.create({
  item: webStyle({
    flex: 1,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: space.xxs,
    minHeight: 52,
    minWidth: touchTarget,
    borderTopWidth: 2,
    borderTopStyle: 'solid',
    textDecorationLine: 'none',
  }),
});

const styles = StyleSheet.create({
  rail: webStyle({
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
    minHeight: touchTarget,
    paddingLeft: space.sm,
    paddingRight: space.sm,
    borderLeftWidth: 3,
    borderLeftStyle: 'solid',
    borderLeftColor: 'transparent',
    borderRadius: radius.sm,
    textDecorationLine: 'none',
  }),
});
