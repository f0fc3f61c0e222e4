import { useId, useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { fontFamily, hairline, space, touchTarget, type } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';

type DisclosureProps = {
  /** the line that is always there, and opens the rest; it also names the rest */
  summary: ReactNode;
  children: ReactNode;
  open?: boolean;
};

/** A line that opens what belongs to it. What is closed stays on the page, so that a search or a print finds it. */
export function Disclosure({ summary, children, open: atFirst = false }: DisclosureProps) {
  const theme = useTheme();
  const id = useId();
  const [open, setOpen] = useState(atFirst);
  return (
    <View style={[styles.whole, { borderBottomColor: theme.rule }]}>
      <Element
        tag="button"
        type="button"
        aria-expanded={open}
        aria-controls={id}
        onClick={() => setOpen(!open)}
        style={[styles.line, { color: theme.ink }]}
      >
        <View style={styles.summary}>{summary}</View>
        <View style={[styles.arrow, { borderColor: theme.inkSoft }, open && styles.up]} />
      </Element>
      <Element tag="div" id={id} data-folded={open ? undefined : ''} hidden={!open} style={open ? styles.inside : null}>
        {children}
      </Element>
    </View>
  );
}

const styles = StyleSheet.create({
  whole: { borderBottomWidth: hairline, minWidth: 0 },
  line: webStyle({
    display: 'flex',
    alignItems: 'center',
    gap: space.sm,
    width: '100%',
    minHeight: touchTarget,
    margin: 0,
    paddingTop: space.sm,
    paddingBottom: space.sm,
    paddingLeft: 0,
    paddingRight: space.xs,
    borderWidth: 0,
    backgroundColor: 'transparent',
    fontFamily,
    fontSize: type.body.fontSize,
    textAlign: 'left',
    cursor: 'pointer',
  }),
  summary: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
  arrow: webStyle({
    width: 8,
    height: 8,
    flexShrink: 0,
    marginTop: -4,
    borderStyle: 'solid',
    borderTopWidth: 0,
    borderLeftWidth: 0,
    borderRightWidth: 1.5,
    borderBottomWidth: 1.5,
    transform: 'rotate(45deg)',
  }),
  up: webStyle({ marginTop: 4, transform: 'rotate(225deg)' }),
  inside: webStyle({ paddingBottom: space.md }),
});
