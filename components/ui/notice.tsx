import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { radius, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';

import { Text } from './text';

type NoticeProps = {
  /** caution: mind this; fail: this went wrong; note: by the way */
  tone?: 'caution' | 'fail' | 'note';
  /** "Hot surfaces": what it is about, before the sentence */
  title?: string;
  children: ReactNode;
  /** said at once by a screen reader: for what has just happened */
  urgent?: boolean;
};

const edges = { caution: 'caution', fail: 'fail', note: 'rule' } as const;
const words = { caution: 'caution', fail: 'fail', note: 'ink' } as const;

/** Something to mind, beside what it is about. */
export function Notice({ tone = 'caution', title, children, urgent = false }: NoticeProps) {
  const theme = useTheme();
  const colours = { backgroundColor: theme.sheet, borderLeftColor: theme[edges[tone]] };
  return (
    <View role={urgent ? 'alert' : 'note'} style={[styles.notice, colours]}>
      {title ? (
        <Text weight="strong" tone={words[tone]}>
          {title}
        </Text>
      ) : null}
      {typeof children === 'string' ? <Text>{children}</Text> : children}
    </View>
  );
}

const styles = StyleSheet.create({
  notice: { padding: space.sm, paddingLeft: space.md, borderLeftWidth: 3, borderRadius: radius.sm, gap: space.xxs },
});
