import type { CSSProperties } from 'react';
import type { TextStyle, ViewStyle } from 'react-native';

/** Movement, step by step, as React Native's web version takes it. */
type Keyframes = { animationKeyframes?: Record<string, CSSProperties> };

/** A style that only the web has: sticky, fixed, grid, cursor. */
export function webStyle(style: CSSProperties & Keyframes): TextStyle & ViewStyle {
  // eslint-disable-next-line @typescript-eslint/consistent-type-assertions -- React Native's types leave out what its web version draws
  return style as TextStyle & ViewStyle;
}
