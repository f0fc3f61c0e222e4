import type { CSSProperties } from 'react';
import type { TextStyle, ViewStyle } from 'react-native';

/** A style that only the web has: sticky, fixed, grid, cursor. */
export function webStyle(style: CSSProperties): TextStyle & ViewStyle {
  // eslint-disable-next-line @typescript-eslint/consistent-type-assertions -- React Native's types leave out what its web version draws
  return style as TextStyle & ViewStyle;
}
