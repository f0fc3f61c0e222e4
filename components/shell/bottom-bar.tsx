import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Session } from '@/api/contracts/session';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Dialog } from '@/components/ui/dialog';
import { Element } from '@/components/ui/element';
import { Rule } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { BarItem, barItem, RailItem } from './nav-item';
import { PersonPanel } from './person-panel';
import type { ShellPlaces } from './rail';

/** The foot of a phone: the first places under the thumb, the rest and the person under "More". */
export function BottomBar({ jobName, inJob, general, session }: ShellPlaces & { session: Session }) {
  const theme = useTheme();
  const [open, setOpen] = useState(false);
  const places = inJob.length > 0 ? inJob.slice(0, 4) : general;
  const rest = inJob.length > 0 ? [...inJob.slice(4), ...general] : [];
  return (
    <View
      role="navigation"
      aria-label={jobName ?? 'Thickset'}
      style={[styles.bar, { backgroundColor: theme.sheet, borderTopColor: theme.rule }]}
    >
      {places.map((place) => (
        <BarItem key={place.label} {...place} />
      ))}
      <Element
        tag="button"
        type="button"
        aria-haspopup="dialog"
        onClick={() => setOpen(true)}
        style={[
          barItem.item,
          styles.more,
          { borderTopColor: rest.some(({ current }) => current) ? theme.oxide : 'transparent' },
        ]}
      >
        <Text size="small" tone="inkSoft">
          More
        </Text>
      </Element>
      {open ? (
        <Dialog title={jobName ?? 'Thickset'} onClose={() => setOpen(false)}>
          {rest.length > 0 ? (
            // wherever one of them leads, the list has done its work
            <Element tag="div" onClick={() => setOpen(false)}>
              {rest.map((place) => (
                <RailItem key={place.label} {...place} />
              ))}
            </Element>
          ) : null}
          <Rule />
          <PersonPanel session={session} />
        </Dialog>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: webStyle({
    flexDirection: 'row',
    flexShrink: 0,
    paddingLeft: space.xs,
    paddingRight: space.xs,
    paddingBottom: 'env(safe-area-inset-bottom)',
    borderTopWidth: hairline,
    borderTopStyle: 'solid',
  }),
  more: webStyle({
    display: 'flex',
    margin: 0,
    padding: 0,
    borderLeftWidth: 0,
    borderRightWidth: 0,
    borderBottomWidth: 0,
    backgroundColor: 'transparent',
    cursor: 'pointer',
  }),
});
