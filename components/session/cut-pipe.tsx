import { StyleSheet, View } from 'react-native';

import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

/** A cut pipe in two layers, a drawing for the eye: jacket, layers, wall, bore, as parts of its width. */
export function CutPipe({ size }: { size: number }) {
  const theme = useTheme();
  return (
    <View aria-hidden style={{ width: size, height: size }}>
      <Circle of={size} part={1} fill={theme.sheet} hatch={fibres(theme.rule)} line={theme.ink} weight={2} />
      <Circle of={size} part={0.68} fill={theme.sheet} hatch={fibres(theme.rule)} line={theme.ink} weight={1} />
      <Circle of={size} part={0.37} fill={theme.sheet} hatch={cutSteel(theme.hot)} line={theme.ink} weight={2} />
      <Circle of={size} part={0.33} fill={theme.paper} line={theme.ink} weight={1} />
    </View>
  );
}

type CircleProps = { of: number; part: number; fill: string; hatch?: string; line: string; weight: number };

function Circle({ of, part, fill, hatch, line, weight }: CircleProps) {
  const side = of * part;
  const place = { width: side, height: side, left: (of - side) / 2, top: (of - side) / 2, borderRadius: side / 2 };
  const look = webStyle({
    backgroundColor: fill,
    backgroundImage: hatch,
    backgroundPosition: 'center',
    borderColor: line,
    borderWidth: weight,
  });
  return <View style={[styles.circle, place, look]} />;
}

const cutSteel = (colour: string) => `repeating-linear-gradient(135deg, ${colour} 0 1px, transparent 1px 7px)`;

/** The zigzag that stands for mineral fibre. */
function fibres(colour: string): string {
  const zigzag = `<path d="M0 3l6 6 6-6 6 6 6-6" fill="none" stroke="${colour}" stroke-width="1.2"/>`;
  const tile = `<svg xmlns="http://www.w3.org/2000/svg" width="24" height="13">${zigzag}</svg>`;
  return `url("data:image/svg+xml,${encodeURIComponent(tile)}")`;
}

const styles = StyleSheet.create({
  circle: webStyle({ position: 'absolute', boxSizing: 'border-box', borderStyle: 'solid' }),
});
