import type { Href } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';

import { Heading } from './heading';
import { Link, LinkArea } from './link';
import { Text } from './text';

export type ListItem = { key: string; title: string; text?: string; aside?: string; href: Href };

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
          <Link href={href} label="Show as a table" size="small" />
          {add ? <Link href={add.href} label={add.label} size="small" /> : null}
        </View>
      </View>
      <View role="list" style={[styles.list, { borderTopColor: theme.rule }]}>
        {items.map(({ key, ...item }) => (
          <View key={key} role="listitem">
            <Item {...item} isChosen={key === chosen} />
          </View>
        ))}
      </View>
    </View>
  );
}

function Item({ title, text, aside, href, isChosen }: Omit<ListItem, 'key'> & { isChosen: boolean }) {
  const theme = useTheme();
  const colours = { borderBottomColor: theme.rule, borderLeftColor: isChosen ? theme.oxide : 'transparent' };
  return (
    <LinkArea href={href} current={isChosen}>
      <View style={[styles.item, colours, isChosen && { backgroundColor: theme.sheet }]}>
        <View style={styles.words}>
          <Text weight="strong">{title}</Text>
          {text ? (
            <Text size="small" tone="inkSoft">
              {text}
            </Text>
          ) : null}
        </View>
        {aside ? (
          <Text weight="strong" numeric noWrap>
            {aside}
          </Text>
        ) : null}
      </View>
    </LinkArea>
  );
}

const styles = StyleSheet.create({
  head: { paddingHorizontal: space.md, paddingTop: space.lg, paddingBottom: space.xs },
  links: { flexDirection: 'row', gap: space.md, flexWrap: 'wrap' },
  list: { borderTopWidth: hairline },
  item: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    minHeight: 60,
    paddingVertical: space.xs,
    paddingRight: space.md,
    paddingLeft: space.md - 3,
    borderLeftWidth: 3,
    borderBottomWidth: hairline,
  },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
});
