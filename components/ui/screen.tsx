import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { hairline, measure, space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { ActionButton } from './action-button';
import { ScreenHead, type HeadProps } from './screen-head';
import { useTitle } from './use-title';

export type ScreenProps = HeadProps & {
  /** the tab's title, where the heading alone says too little there */
  tabTitle?: string;
  /** stays in sight below what scrolls */
  footer?: ReactNode;
  /** text and forms: no wider than reads well */
  narrow?: boolean;
  /** the content fills the screen and scrolls by itself */
  fixed?: boolean;
  /** nothing on it takes the focus, so it does: the keyboard scrolls it */
  forReading?: boolean;
  children: ReactNode;
};

export function Screen({ children, fixed, narrow, footer, action, ...head }: ScreenProps) {
  const { isPhone } = useLayout();
  useTitle(head.tabTitle ?? head.title);
  const atFoot = isPhone && !footer && action;
  return (
    <View style={styles.screen}>
      <View tabIndex={tabStopOf(head)} style={[styles.scroll, fixed ? styles.fixed : styles.scrolls]}>
        <View style={[isPhone ? styles.phone : styles.wide, fixed && styles.fill, narrow && styles.narrow]}>
          <ScreenHead {...head} action={atFoot ? undefined : action} />
          {children}
        </View>
      </View>
      <ScreenFoot>{atFoot ? <ActionButton action={atFoot} full /> : footer}</ScreenFoot>
    </View>
  );
}

const tabStopOf = ({ forReading }: Pick<ScreenProps, 'forReading'>) => (forReading ? 0 : undefined);

function ScreenFoot({ children }: { children: ReactNode }) {
  const theme = useTheme();
  if (!children) return null;
  return <View style={[styles.foot, { backgroundColor: theme.sheet, borderTopColor: theme.rule }]}>{children}</View>;
}

const styles = StyleSheet.create({
  screen: { flex: 1, minHeight: 0 },
  scroll: { flex: 1, minHeight: 0 },
  scrolls: webStyle({ overflowY: 'auto', overflowX: 'hidden', overscrollBehavior: 'contain' }),
  fixed: { overflow: 'hidden' },
  fill: { flex: 1, minHeight: 0 },
  phone: { paddingHorizontal: space.md, paddingTop: space.xs, paddingBottom: space.lg, gap: space.md },
  wide: { paddingHorizontal: space.lg, paddingTop: space.lg, paddingBottom: space.xl, gap: space.md },
  narrow: { maxWidth: measure },
  foot: webStyle({
    display: 'flex',
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: space.xs,
    paddingTop: space.sm,
    paddingBottom: space.sm,
    paddingLeft: space.md,
    paddingRight: space.md,
    borderTopWidth: hairline,
    borderTopStyle: 'solid',
  }),
});
