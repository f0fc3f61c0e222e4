import { scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';

type Point = readonly [x: number, y: number];
type Tick = { at: number; value: number };
type Frame = { width: number; height: number; left: number; right: number; top: number; bottom: number };

export type CurvePlot = {
  frame: Frame;
  across: Tick[];
  up: Tick[];
  /** one for each curve, in its order */
  curves: { path: string; dots: { x: number; y: number }[] }[];
};

const margin = { left: 52, right: 12, top: 12, bottom: 28 };

/**
 * Curves of one quantity over another in one frame, straight between their points as they are calculated with.
 * Axes begin and end on round numbers; the upward one begins at zero, so that a steep curve is steep.
 *
 * @param curves - points of each curve, rising in x, in the units that are shown
 * @param size - of the whole drawing [px]
 */
export function curvePlot(
  curves: readonly (readonly Point[])[],
  { width, height }: { width: number; height: number },
): CurvePlot {
  const all = curves.flat();
  const [x0, x1] = range(all.map(([x]) => x));
  const highest = Math.max(0, ...all.map(([, y]) => y));
  const x = scaleLinear([x0, x1], [margin.left, width - margin.right]).nice(6);
  const y = scaleLinear([0, highest || 1], [height - margin.bottom, margin.top]).nice(4);
  const path = line<Point>(
    ([across]) => x(across),
    ([, up]) => y(up),
  ).digits(1);
  return {
    frame: {
      width,
      height,
      left: margin.left,
      right: width - margin.right,
      top: margin.top,
      bottom: height - margin.bottom,
    },
    across: x.ticks(width < 420 ? 4 : 6).map((value) => ({ value, at: x(value) })),
    up: y.ticks(4).map((value) => ({ value, at: y(value) })),
    curves: curves.map((points) => ({
      path: path([...points]) ?? '',
      dots: points.map(([across, up]) => ({ x: x(across), y: y(up) })),
    })),
  };
}

/** A single point still gets an axis to stand on. */
function range(values: readonly number[]): [number, number] {
  const [low, high] = [Math.min(...values), Math.max(...values)];
  return low < high ? [low, high] : [low - 10, high + 10];
}
