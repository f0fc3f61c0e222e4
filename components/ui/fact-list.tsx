import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { hairline, space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';
import { Text } from './text';

export type Fact = { term: string; value: ReactNode; note?: string };

/** What is known about one thing: a term and its value on each line, hairlines between. */
export function FactList({ facts, termWidth = 132 }: { facts: readonly Fact[]; termWidth?: number }) {
  const theme = useTheme();
  const { isPhone } = useLayout();
  return (
    <Element tag="dl" style={styles.list}>
      {facts.map(({ term, value, note }) => (
        <Element tag="div" key={term} style={[styles.fact, { borderBottomColor: theme.rule }]}>
          <Element tag="dt" style={[styles.term, { width: isPhone ? Math.min(termWidth, 112) : termWidth }]}>
            <Text tone="inkSoft">{term}</Text>
          </Element>
          <Element tag="dd" style={styles.value}>
            {typeof value === 'string' || typeof value === 'number' ? (
              <Text numeric>{value}</Text>
            ) : (
              <View>{value}</View>
            )}
            {note ? (
              <Text size="small" tone="inkSoft">
                {note}
              </Text>
            ) : null}
          </Element>
        </Element>
      ))}
    </Element>
  );
}

const styles = StyleSheet.create({
  list: webStyle({ margin: 0, minWidth: 0 }),
  fact: webStyle({
    display: 'flex',
    flexDirection: 'row',
    gap: space.sm,
    paddingTop: space.xs,
    paddingBottom: space.xs,
    borderBottomWidth: hairline,
    borderBottomStyle: 'solid',
  }),
  term: webStyle({ flexShrink: 0 }),
  value: webStyle({
    display: 'flex',
    flexDirection: 'column',
    margin: 0,
    flex: 1,
    minWidth: 0,
    overflowWrap: 'anywhere',
  }),
});
