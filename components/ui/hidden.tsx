import type { ReactNode } from 'react';
import { StyleSheet, View, type ViewProps } from 'react-native';

import { webStyle } from '@/components/theme/web-style';

import { Text } from './text';

type HiddenProps = { children: ReactNode } & Pick<ViewProps, 'role' | 'aria-live'>;

/** Words that are read and not drawn. */
export const Hidden = ({ children, ...rest }: HiddenProps) => (
  <View {...rest} style={styles.hidden}>
    <Text>{children}</Text>
  </View>
);

const styles = StyleSheet.create({
  hidden: webStyle({ position: 'absolute', width: 1, height: 1, overflow: 'hidden', clipPath: 'inset(50%)' }),
});
