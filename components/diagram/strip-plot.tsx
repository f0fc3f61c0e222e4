import Svg, { Circle, G, Line, Path, Text } from 'react-native-svg';

import type { StripColumn, StripCurve, StripLayout, StripPoint } from '@/api/geometry/strip';
import { fontFamily, type } from '@/components/theme/tokens';
import { useTheme, type Theme } from '@/components/theme/use-theme';

export type PlottedCurve = { id: string; ink: 'hot' | 'cold' };

type StripPlotProps = {
  layout: StripLayout;
  /** in which ink each curve is drawn, by its id */
  inks: Record<string, 'hot' | 'cold'>;
  selected: number;
  /** a value as it is written beside its point */
  text: (value: number) => string;
};

/** Above the sections: what changes with the thickness, and the levels it must keep to. What it says, the table says too. */
export function StripPlot({ layout, inks, selected, text }: StripPlotProps) {
  const theme = useTheme();
  const { width, base, ticks, levels, curves, columns } = layout;
  return (
    <Svg aria-hidden width={width} height={base + 1} viewBox={`0 0 ${width} ${base + 1}`}>
      {ticks.map(({ value, y }) => (
        <Line
          key={value}
          x1={0}
          x2={width}
          y1={y}
          y2={y}
          stroke={theme.rule}
          strokeWidth={0.75}
          strokeDasharray="1 3"
        />
      ))}
      {columns.map((column, index) => (
        <Hairline key={column.x} column={column} curves={curves} index={index} />
      ))}
      {levels.map(({ id, y }) => (
        <Line key={id} x1={0} x2={width} y1={y} y2={y} stroke={theme.fail} strokeWidth={1.25} />
      ))}
      {curves.map((curve) => (
        <Curve key={curve.id} curve={curve} ink={theme[inks[curve.id] ?? 'hot']} selected={selected} text={text} />
      ))}
      <Line x1={0} x2={width} y1={base} y2={base} stroke={theme.ink} strokeWidth={1.5} />
    </Svg>
  );
}

/** From the highest point over a section down to it. */
function Hairline({ column, curves, index }: { column: StripColumn; curves: readonly StripCurve[]; index: number }) {
  const theme = useTheme();
  const ys = curves.flatMap(({ points }) => (points[index] ? [points[index].y] : []));
  if (ys.length === 0) return null;
  const end = column.drawingTop + column.drawing.box.y;
  return <Line x1={column.x} x2={column.x} y1={Math.min(...ys)} y2={end} stroke={theme.rule} strokeWidth={1} />;
}

type CurveProps = { curve: StripCurve; ink: string; selected: number; text: (value: number) => string };

function Curve({ curve, ink, selected, text }: CurveProps) {
  const theme = useTheme();
  return (
    <G>
      <Path d={curve.path} fill="none" stroke={ink} strokeWidth={2} strokeLinejoin="round" />
      {curve.points.map((point, index) =>
        point ? (
          <Point
            key={point.x}
            point={point}
            ink={ink}
            strong={index === selected}
            label={text(point.value)}
            theme={theme}
          />
        ) : null,
      )}
    </G>
  );
}

type PointProps = { point: StripPoint; ink: string; strong: boolean; label: string; theme: Theme };

function Point({ point, ink, strong, label, theme }: PointProps) {
  const { x, y, off, labelY } = point;
  if (off) return <OffScale point={point} ink={ink} />;
  return (
    <G>
      <Circle cx={x} cy={y} r={strong ? 5 : 3.5} fill={theme.paper} stroke={ink} strokeWidth={2} />
      <Figure x={x} y={labelY} strong={strong} fill={theme.ink} halo={theme.paper}>
        {label}
      </Figure>
    </G>
  );
}

/** Beyond the scale: an arrow at its edge that says which way, and the value. */
function OffScale({ point: { x, y, off, value }, ink }: { point: StripPoint; ink: string }) {
  const theme = useTheme();
  const up = off === 'above';
  const tip = up
    ? `M${x - 5} ${y - 4}L${x} ${y - 12}L${x + 5} ${y - 4}Z`
    : `M${x - 5} ${y - 10}L${x} ${y - 2}L${x + 5} ${y - 10}Z`;
  return (
    <G>
      <Path d={tip} fill={ink} />
      <Figure x={x} y={y + 8} fill={ink} halo={theme.paper}>
        {`${Math.round(value)}`.replace('-', '−')}
      </Figure>
    </G>
  );
}

type FigureProps = { x: number; y: number; fill: string; halo: string; strong?: boolean; children: string };

/** Written twice: the first one in the paper's colour keeps lines away from the figures. */
function Figure({ x, y, fill, halo, strong = false, children }: FigureProps) {
  const shared = {
    x,
    y: y + 4.5,
    textAnchor: 'middle' as const,
    fontFamily,
    fontSize: strong ? type.body.fontSize : type.small.fontSize,
    fontWeight: strong ? '700' : '400',
  };
  return (
    <G>
      <Text {...shared} fill={halo} stroke={halo} strokeWidth={4} strokeLinejoin="round">
        {children}
      </Text>
      <Text {...shared} fill={fill}>
        {children}
      </Text>
    </G>
  );
}
