import type { ReactNode } from 'react';
import { StyleSheet } from 'react-native';

import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';

export const mainId = 'main';

/** The one main region of a page, where the skip link leads. The shell has it; a page without the shell brings its own. */
export function Main({ children }: { children: ReactNode }) {
  return (
    <Element tag="main" id={mainId} tabIndex={-1} style={styles.main}>
      {children}
    </Element>
  );
}

const styles = StyleSheet.create({
  main: webStyle({ display: 'flex', flexDirection: 'column', flex: 1, minWidth: 0, minHeight: 0, height: '100%' }),
});
