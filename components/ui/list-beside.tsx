import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { hairline } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

type ListBesideProps = {
  /** what can be gone to; it stays and scrolls by itself */
  list: ReactNode;
  /** whether one of it is open: the list alone needs no list beside it */
  isOpen: boolean;
  children: ReactNode;
};

/** A list beside what is open from it, where there is room; elsewhere what is open has the screen to itself. */
export function ListBeside({ list, isOpen, children }: ListBesideProps) {
  const theme = useTheme();
  const { isSplit } = useLayout();
  // the open part keeps its place in the tree, so that turning or resizing loses nothing that was typed
  return (
    <View style={styles.both}>
      {isSplit && isOpen ? <View style={[styles.list, { borderRightColor: theme.rule }]}>{list}</View> : null}
      <View key="open" style={styles.open}>
        {children}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  both: { flexDirection: 'row', flex: 1, minHeight: 0, minWidth: 0 },
  list: webStyle({
    width: 360,
    flexShrink: 0,
    overflowY: 'auto',
    borderRightWidth: hairline,
    borderRightStyle: 'solid',
  }),
  open: { flex: 1, minWidth: 0, minHeight: 0 },
});
