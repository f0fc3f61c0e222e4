import type { Href } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';

import { Heading } from './heading';
import { Link } from './link';
import { ListRows, type ListItem } from './list-row';

type ListPaneProps = {
  title: string;
  /** the whole of it, on a screen of its own */
  href: Href;
  items: readonly ListItem[];
  chosen?: string;
  add?: { label: string; href: Href };
};

/** The list that stands beside what is open from it. */
export function ListPane({ title, href, items, chosen, add }: ListPaneProps) {
  const theme = useTheme();
  return (
    <View role="navigation" aria-label={title}>
      <View style={styles.head}>
        <Heading>{title}</Heading>
        <View style={styles.links}>
          <Link href={href} label="All in one table" />
          {add ? <Link href={add.href} label={add.label} /> : null}
        </View>
      </View>
      <View style={[styles.list, { borderTopColor: theme.rule }]}>
        <ListRows label={title} items={items} chosen={chosen} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  head: { paddingHorizontal: space.md, paddingTop: space.lg },
  links: { flexDirection: 'row', columnGap: space.md, flexWrap: 'wrap' },
  list: { borderTopWidth: hairline },
});
