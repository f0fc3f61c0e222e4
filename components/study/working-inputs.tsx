import { StyleSheet } from 'react-native';

import type { Working } from '@/api/contracts/study';
import { wordsText } from '@/api/contracts/words-text';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Element } from '@/components/ui/element';
import { Stack } from '@/components/ui/stack';
import { Text, Words } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { Symbols } from './symbols';

type Inputs = Working['steps'][number]['inputs'];

/** What was put into an equation: the symbol, its value and meaning, and who says so. */
export function WorkingInputs({ inputs }: { inputs: Inputs }) {
  const theme = useTheme();
  const { units } = useUnits();
  return (
    <Element tag="dl" style={styles.list}>
      {inputs.map(({ symbol, meaning, value, source }, index) => (
        <Element tag="div" key={`${index} ${symbol}`} style={[styles.input, { borderBottomColor: theme.rule }]}>
          <Element tag="dt" style={styles.symbol}>
            <Text tone="inkSoft">
              <Symbols>{symbol}</Symbols>
            </Text>
          </Element>
          <Element tag="dd" style={styles.value}>
            <Stack gap="xxs">
              <Text numeric>
                <Words weight="strong">{wordsText(value, units)}</Words>
                {` ${meaning}`}
              </Text>
              {source ? (
                <Text size="small" tone="inkSoft">
                  {source}
                </Text>
              ) : null}
            </Stack>
          </Element>
        </Element>
      ))}
    </Element>
  );
}

const styles = StyleSheet.create({
  list: webStyle({ margin: 0 }),
  input: webStyle({
    display: 'flex',
    gap: space.sm,
    paddingTop: space.xs,
    paddingBottom: space.xs,
    borderBottomWidth: hairline,
    borderBottomStyle: 'solid',
  }),
  symbol: webStyle({ width: 72, flexShrink: 0 }),
  value: webStyle({ margin: 0, flex: 1, minWidth: 0 }),
});
