import { StyleSheet, View } from 'react-native';

import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { Text } from '@/components/ui/text';

/** The mark, a ring with an off-centre bore, and the name. */
export function Brand({ size = 24 }: { size?: number }) {
  return (
    <View style={styles.brand}>
      <Ring size={size} />
      <Text size="lead" weight="bold">
        Thickset
      </Text>
    </View>
  );
}

function Ring({ size }: { size: number }) {
  const theme = useTheme();
  const bore = size * 0.38;
  return (
    <View style={{ width: size, height: size, borderRadius: size / 2, backgroundColor: theme.oxide }}>
      <View
        style={[
          styles.bore,
          { width: bore, height: bore, borderRadius: bore / 2, left: size * 0.42, top: size * 0.4 },
          { backgroundColor: theme.paper },
        ]}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  brand: { flexDirection: 'row', alignItems: 'center', gap: space.xs },
  bore: { position: 'absolute' },
});
