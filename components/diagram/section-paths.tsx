import { G, Path } from 'react-native-svg';

import type { SectionDrawing } from '@/api/geometry/section';
import { useTheme } from '@/components/theme/use-theme';

/** The lines of a section, in the inks of the look: layers from the outside in, then the bore over them. */
export function SectionPaths({ drawing }: { drawing: SectionDrawing }) {
  const theme = useTheme();
  const { bore, layers, jacket, pens, nature } = drawing;
  const ink = theme[nature];
  return (
    <G fill="none" strokeLinecap="round" strokeLinejoin="round">
      {layers.toReversed().map(({ outline }) => (
        <Path key={outline} d={outline} fill={theme.sheet} stroke={theme.ink} strokeWidth={pens.outline} />
      ))}
      {layers.map(({ outline, hatch, hatchPen }) => (
        <Path key={outline} d={hatch} stroke={theme.inkSoft} strokeWidth={hatchPen} />
      ))}
      <Path d={bore.outline} fill={theme.sheet} />
      <Path d={bore.outline} fill={ink} fillOpacity={0.16} stroke={theme.ink} strokeWidth={pens.wall} />
      <Path d={bore.hatch} stroke={ink} strokeWidth={pens.hatch * 1.3} />
      <Path d={jacket} stroke={theme.ink} strokeWidth={pens.jacket} />
    </G>
  );
}
