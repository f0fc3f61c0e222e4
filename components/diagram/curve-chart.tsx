import Svg, { Circle, G, Line, Path, Text } from 'react-native-svg';

import { curvePlot } from '@/api/geometry/curve';
import { fontFamily, type } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';

type CurveChartProps = {
  /** what it shows, in words: the numbers stand in a table beside it */
  label: string;
  /** in the units that are shown; the first is the one that is calculated with */
  curves: readonly (readonly (readonly [number, number])[])[];
  across: string;
  up: string;
  digits: number;
};

/** Curves through their points: the first one drawn strong, the others to compare. */
export function CurveChart({ label, curves, across, up, digits }: CurveChartProps) {
  const theme = useTheme();
  const { isPhone } = useLayout();
  const { frame, ...plot } = curvePlot(curves, isPhone ? { width: 340, height: 220 } : { width: 620, height: 280 });
  const words = { fontFamily, fontSize: type.small.fontSize, fill: theme.inkSoft };
  return (
    <Svg
      role="img"
      aria-label={label}
      width="100%"
      height={frame.height}
      viewBox={`0 0 ${frame.width} ${frame.height}`}
      preserveAspectRatio="xMinYMin meet"
    >
      {plot.up.map(({ at, value }) => (
        <G key={value}>
          <Line x1={frame.left} x2={frame.right} y1={at} y2={at} stroke={theme.rule} strokeWidth={1} />
          <Text {...words} x={frame.left - 8} y={at + 4} textAnchor="end">
            {value.toFixed(digits)}
          </Text>
        </G>
      ))}
      {plot.across.map(({ at, value }) => (
        <Text key={value} {...words} x={at} y={frame.bottom + 18} textAnchor="middle">
          {String(value).replace('-', '−')}
        </Text>
      ))}
      <Text {...words} x={frame.right} y={frame.bottom - 6} textAnchor="end">
        {across}
      </Text>
      <Text {...words} x={frame.left + 6} y={frame.top + 8}>
        {up}
      </Text>
      {plot.curves
        .map(({ path, dots }, index) => <Curve key={path} path={path} dots={dots} isUsed={index === 0} />)
        .reverse()}
    </Svg>
  );
}

type CurveProps = { path: string; dots: readonly { x: number; y: number }[]; isUsed: boolean };

function Curve({ path, dots, isUsed }: CurveProps) {
  const theme = useTheme();
  const ink = isUsed ? theme.oxide : theme.inkSoft;
  return (
    <G>
      <Path
        d={path}
        fill="none"
        stroke={ink}
        strokeWidth={isUsed ? 2.5 : 1}
        strokeDasharray={isUsed ? undefined : '4 3'}
      />
      {dots.map(({ x, y }) => (
        <Circle
          key={x}
          cx={x}
          cy={y}
          r={isUsed ? 4 : 2}
          fill={isUsed ? theme.sheet : ink}
          stroke={ink}
          strokeWidth={isUsed ? 2 : 1}
        />
      ))}
    </G>
  );
}
