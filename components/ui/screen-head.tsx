import type { Href } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { space } from '@/components/theme/tokens';

import { BackLink } from './back-link';
import { ActionButton, type Action } from './action-button';
import { Heading } from './heading';
import { Text } from './text';

export type HeadProps = {
  title: string;
  /** a line under the title: what is on the screen, counted */
  lead?: ReactNode;
  /** above the title: where this thing belongs */
  over?: ReactNode;
  back?: { href: Href; label: string };
  /** the one thing to do here: beside the title, on a phone at the foot */
  action?: Action;
  /** right of the title on a wide screen, below it on a phone */
  aside?: ReactNode;
};

export function ScreenHead({ title, lead, over, back, action, aside }: HeadProps) {
  return (
    <View style={styles.head}>
      {back ? <BackLink href={back.href} label={back.label} /> : null}
      <View style={styles.titleRow}>
        <View style={styles.title}>
          {over ? <Soft>{over}</Soft> : null}
          <Heading level={1}>{title}</Heading>
          {lead ? <Soft>{lead}</Soft> : null}
        </View>
        {aside}
        {action ? <ActionButton action={action} /> : null}
      </View>
    </View>
  );
}

const Soft = ({ children }: { children: ReactNode }) =>
  typeof children === 'string' ? <Text tone="inkSoft">{children}</Text> : children;

const styles = StyleSheet.create({
  head: { gap: space.xxs },
  titleRow: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'flex-end', gap: space.sm },
  title: { flexGrow: 1, flexShrink: 1, flexBasis: 280, gap: 2 },
});
