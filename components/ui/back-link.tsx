import { Link, type Href } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { space, touchTarget } from '@/components/theme/tokens';
import { webStyle } from '@/components/theme/web-style';

import { Text } from './text';

/** To where this thing belongs: its list, its job. */
export function BackLink({ href, label }: { href: Href; label: string }) {
  return (
    <Link href={href} asChild>
      <View style={styles.back}>
        <Text size="lead" decorative>
          ‹
        </Text>
        <Text tone="inkSoft">{label}</Text>
      </View>
    </Link>
  );
}

const styles = StyleSheet.create({
  back: webStyle({
    flexDirection: 'row',
    alignItems: 'center',
    alignSelf: 'flex-start',
    gap: space.xs,
    minHeight: touchTarget,
    paddingRight: space.sm,
    textDecorationLine: 'none',
  }),
});
