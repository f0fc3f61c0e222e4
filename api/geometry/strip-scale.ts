import { scaleLinear, type ScaleLinear } from 'd3-scale';

type Plotted = {
  curves: readonly { values: readonly (number | null)[] }[];
  levels: readonly { value: number }[];
};

/**
 * A scale on which the decision can be read: every level and the thicker half of every curve lie on it, and of the rest
 * what is no further from them than they are from each other; what lies further out (a bare steam pipe) is off it.
 *
 * @param range - where the lowest and the highest value are drawn
 */
export function scaleOf({ curves, levels }: Plotted, range: [number, number]): ScaleLinear<number, number> {
  const all = curves.map(({ values }) => values.filter((value) => value !== null));
  const held = [...all.flatMap(thickerHalf), ...levels.map(({ value }) => value)];
  if (held.length === 0) return scaleLinear([0, 1], range);
  const [low, high] = [Math.min(...held), Math.max(...held)];
  const reach = Math.max(high - low, leastSpan);
  const near = [...held, ...all.flat().filter((value) => value >= low - reach && value <= high + reach)];
  const [lowest, highest] = [Math.min(...near), Math.max(...near)];
  const edge = Math.max((highest - lowest) * 0.12, leastSpan / 4);
  return scaleLinear([lowest - edge, highest + edge], range).nice(5);
}

const leastSpan = 2;
const thickerHalf = (values: readonly number[]) => values.slice(Math.floor(values.length / 2));
