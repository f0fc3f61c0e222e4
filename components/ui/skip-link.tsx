import { useState } from 'react';
import { StyleSheet } from 'react-native';

import { fontFamily, radius, space, touchTarget, type, weight } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';
import { mainId } from './main';

/** The first stop of the Tab key; seen only while it is one. */
export function SkipLink() {
  const theme = useTheme();
  const [shown, setShown] = useState(false);
  return (
    <Element
      tag="a"
      href={`#${mainId}`}
      onFocus={() => setShown(true)}
      onBlur={() => setShown(false)}
      onClick={(event) => {
        // the address stays as it is: a hash would be a page of its own for the router
        event.preventDefault();
        document.getElementById(mainId)?.focus();
      }}
      style={[styles.link, { backgroundColor: theme.ink, color: theme.paper }, !shown && styles.away]}
    >
      Skip to the content
    </Element>
  );
}

const styles = StyleSheet.create({
  link: webStyle({
    position: 'fixed',
    left: space.xs,
    top: space.xs,
    zIndex: 20,
    display: 'flex',
    alignItems: 'center',
    minHeight: touchTarget,
    paddingLeft: space.md,
    paddingRight: space.md,
    borderRadius: radius.sm,
    fontFamily,
    fontSize: type.body.fontSize,
    fontWeight: weight.strong,
  }),
  away: webStyle({ transform: 'translateY(-200%)' }),
});
