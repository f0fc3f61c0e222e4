import type { Href } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';

import { LinkArea } from './link';
import { Text } from './text';

export type ListItem = {
  key: string;
  title: string;
  text?: string;
  /** the one fact by which it is known, set to the right */
  aside?: string;
  /** the ink of that fact: a hot or a cold service */
  tone?: 'hot' | 'cold';
  /** what it looks like, drawn 28 or 40 wide */
  glyph?: ReactNode;
  href: Href;
};

type ListRowsProps = {
  /** what the list lists */
  label: string;
  items: readonly ListItem[];
  chosen?: string;
  /** flush with what stands above: no room at the sides */
  flush?: boolean;
};

/** Things that can be gone to: a name, a line about it, and the one fact by which it is known. */
export function ListRows({ label, items, chosen, flush = false }: ListRowsProps) {
  return (
    <View role="list" aria-label={label}>
      {items.map(({ key, ...item }) => (
        <View key={key} role="listitem">
          <ListRow {...item} isChosen={key === chosen} flush={flush} />
        </View>
      ))}
    </View>
  );
}

function ListRow({
  title,
  text,
  aside,
  tone,
  glyph,
  href,
  isChosen,
  flush,
}: Omit<ListItem, 'key'> & { isChosen: boolean; flush: boolean }) {
  const theme = useTheme();
  const colours = { borderBottomColor: theme.rule, borderLeftColor: isChosen ? theme.oxide : 'transparent' };
  return (
    <LinkArea href={href} current={isChosen}>
      <View style={[styles.row, colours, flush && styles.flush, isChosen && { backgroundColor: theme.sheet }]}>
        {glyph ? <View style={styles.glyph}>{glyph}</View> : null}
        <View style={styles.words}>
          <Text weight="strong">{title}</Text>
          {text ? (
            <Text size="small" tone="inkSoft" lines={flush ? undefined : 2}>
              {text}
            </Text>
          ) : null}
        </View>
        {aside ? (
          <View style={styles.aside}>
            <Text numeric align="right" tone={tone} weight={tone ? 'strong' : 'regular'}>
              {aside}
            </Text>
          </View>
        ) : null}
      </View>
    </LinkArea>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    minHeight: 52,
    paddingVertical: space.xs,
    paddingRight: space.md,
    paddingLeft: space.md - 3,
    borderLeftWidth: 3,
    borderBottomWidth: hairline,
  },
  flush: { paddingLeft: 0, paddingRight: space.xs, borderLeftWidth: 0 },
  glyph: { flexShrink: 0 },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
  aside: { flexShrink: 0, maxWidth: '40%' },
});
