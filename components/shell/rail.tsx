import { Link } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Session } from '@/api/contracts/session';
import { hairline, railWidth, space, touchTarget } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Text } from '@/components/ui/text';

import { Brand } from './brand';
import { RailItem, type Place } from './nav-item';
import { PersonPanel } from './person-panel';

export type ShellPlaces = { jobName?: string; inJob: Place[]; general: Place[] };

/** The left edge of a wide screen: the job's places, then the rest, then the person. */
export function Rail({ jobName, inJob, general, session }: ShellPlaces & { session: Session }) {
  const theme = useTheme();
  return (
    <View role="banner" style={[styles.rail, { borderRightColor: theme.rule }]}>
      <Link href="/jobs" asChild>
        <View style={styles.brand}>
          <Brand />
        </View>
      </Link>
      {inJob.length > 0 ? (
        <Places label={jobName ?? 'This job'} title={jobName} places={inJob} />
      ) : (
        <Places label="Thickset" places={general} />
      )}
      <View style={styles.foot}>
        {inJob.length > 0 ? <Places label="Thickset" places={general} /> : null}
        <View style={[styles.person, { borderTopColor: theme.rule }]}>
          <PersonPanel session={session} />
        </View>
      </View>
    </View>
  );
}

function Places({ label, title, places }: { label: string; title?: ReactNode; places: Place[] }) {
  return (
    <View role="navigation" aria-label={label} style={styles.places}>
      {title ? (
        <View style={styles.title}>
          <Text size="small" tone="inkSoft" lines={2}>
            {title}
          </Text>
        </View>
      ) : null}
      {places.map((place) => (
        <RailItem key={place.label} {...place} />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  rail: webStyle({
    width: railWidth,
    flexShrink: 0,
    boxSizing: 'border-box',
    height: '100%',
    overflowY: 'auto',
    paddingLeft: space.md,
    paddingRight: space.md,
    paddingTop: space.md,
    paddingBottom: space.md,
    gap: space.md,
    borderRightWidth: hairline,
    borderRightStyle: 'solid',
  }),
  brand: webStyle({
    minHeight: touchTarget,
    justifyContent: 'center',
    textDecorationLine: 'none',
    paddingLeft: space.xxs,
  }),
  places: { gap: 0 },
  title: { paddingLeft: space.sm + 3, paddingBottom: space.xxs },
  foot: webStyle({ marginTop: 'auto', gap: space.md }),
  person: { borderTopWidth: hairline, paddingTop: space.md },
});
