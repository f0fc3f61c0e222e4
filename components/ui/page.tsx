import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { useTheme } from '@/components/theme/use-theme';

/** The paper on which everything lies. */
export function Page({ children }: { children: ReactNode }) {
  const theme = useTheme();
  return <View style={[styles.page, { backgroundColor: theme.paper }]}>{children}</View>;
}

const styles = StyleSheet.create({ page: { flex: 1, minWidth: 0, minHeight: 0 } });
