import { StyleSheet, View } from 'react-native';

import { hairline, radius, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';

import { Text } from './text';

/** A small named value: "size DN 100 steel", or a state on its own: "Draft". */
export function Tag({ name, value }: { name?: string; value: string }) {
  const theme = useTheme();
  return (
    <View style={[styles.tag, { borderColor: theme.rule, backgroundColor: theme.paper }]}>
      {name ? (
        <Text size="small" tone="inkSoft">
          {`${name} `}
        </Text>
      ) : null}
      <Text size="small" weight="strong">
        {value}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  tag: {
    flexDirection: 'row',
    alignItems: 'baseline',
    alignSelf: 'flex-start',
    paddingHorizontal: space.xs,
    paddingVertical: space.xxs,
    borderWidth: hairline,
    borderRadius: radius.sm,
  },
});
