import Svg, { Circle, G, Line, Text } from 'react-native-svg';

import { interfaceMarks, markRadius } from '@/api/geometry/interface-marks';
import { section, type SectionInput } from '@/api/geometry/section';
import { fontFamily, type } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';

import { SectionPaths } from './section-paths';

const size = 280;
const width = size + markRadius + 1;

/** A section with its interfaces numbered from the bore outwards, for a list that says what is there. */
export function NumberedSection({ drawn, label }: { drawn: SectionInput; label: string }) {
  const theme = useTheme();
  const drawing = section(drawn, size);
  return (
    <Svg role="img" aria-label={label} width={width} height={size} viewBox={`0 0 ${width} ${size}`}>
      <SectionPaths drawing={drawing} />
      {interfaceMarks(drawing).map(({ x, y, markY }, index) => (
        <G key={markY}>
          <Line x1={x} x2={x} y1={y} y2={markY} stroke={theme.ink} strokeWidth={1} />
          <Circle cx={x} cy={y} r={2.5} fill={theme.ink} />
          <Circle cx={x} cy={markY} r={markRadius} fill={theme.paper} stroke={theme.ink} strokeWidth={1.2} />
          <Text
            x={x}
            y={markY + 4.5}
            textAnchor="middle"
            fontFamily={fontFamily}
            fontSize={type.small.fontSize}
            fontWeight="700"
            fill={theme.ink}
          >
            {`${index + 1}`}
          </Text>
        </G>
      ))}
    </Svg>
  );
}
