import { StyleSheet, View } from 'react-native';

import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

/** A cut pipe in two layers, as a drawing for the eye: jacket, layers, wall, bore. Measures are parts of its width. */
export function CutPipe({ size }: { size: number }) {
  const theme = useTheme();
  return (
    <View aria-hidden style={{ width: size, height: size }}>
      <Circle of={size} part={1} fill={theme.sheet} hatch={wave(theme.rule)} line={theme.ink} weight={2} />
      <Circle of={size} part={0.68} fill={theme.sheet} hatch={wave(theme.rule)} line={theme.ink} weight={1} />
      <Circle of={size} part={0.38} fill={theme.sheet} hatch={strokes(theme.hot)} line={theme.ink} weight={2} />
      <Circle of={size} part={0.33} fill={theme.paper} line={theme.ink} weight={1} />
    </View>
  );
}

type CircleProps = { of: number; part: number; fill: string; hatch?: string; line: string; weight: number };

function Circle({ of, part, fill, hatch, line, weight }: CircleProps) {
  const side = of * part;
  const place = { width: side, height: side, left: (of - side) / 2, top: (of - side) / 2, borderRadius: side / 2 };
  const look = webStyle({ backgroundColor: fill, backgroundImage: hatch, borderColor: line, borderWidth: weight });
  return <View style={[styles.circle, place, look]} />;
}

const strokes = (colour: string) => `repeating-linear-gradient(135deg, ${colour} 0 1px, transparent 1px 7px)`;
const wave = (colour: string) =>
  `repeating-linear-gradient(90deg, ${colour} 0 1px, transparent 1px 11px), repeating-linear-gradient(0deg, ${colour} 0 1px, transparent 1px 11px)`;

const styles = StyleSheet.create({
  circle: webStyle({ position: 'absolute', boxSizing: 'border-box', borderStyle: 'solid' }),
});
