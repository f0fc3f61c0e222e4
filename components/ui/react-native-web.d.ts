/** The package ships no types; this is the one function the kit takes from it. */
declare module 'react-native-web' {
  import type { ReactElement } from 'react';

  export function unstable_createElement(tag: string, props: object): ReactElement;
}
