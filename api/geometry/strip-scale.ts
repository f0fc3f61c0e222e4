import { scaleLinear, type ScaleLinear } from 'd3-scale';

type Plotted = {
  curves: readonly { values: readonly (number | null)[] }[];
  levels: readonly { value: number }[];
};

/**
 * A scale on which the decision can be read: every level and the thicker half of every curve lie on it, as much room
 * again is left on the side from which a curve comes, and what lies further out (a bare pipe) is off it.
 *
 * @param range - where the lowest and the highest value are drawn
 */
export function scaleOf({ curves, levels }: Plotted, range: [number, number]): ScaleLinear<number, number> {
  const held = [...curves.flatMap(({ values }) => thickerHalf(known(values))), ...levels.map(({ value }) => value)];
  if (held.length === 0) return scaleLinear([0, 1], range);
  const [low, high] = [Math.min(...held), Math.max(...held)];
  const span = Math.max(high - low, leastSpan);
  const falls = curves.some(({ values }) => isFalling(known(values)));
  const rises = curves.some(({ values }) => !isFalling(known(values)));
  return scaleLinear([low - span * (rises ? 1 : 0.4), high + span * (falls ? 1 : 0.4)], range).nice(5);
}

const leastSpan = 2;
const known = (values: readonly (number | null)[]): number[] => values.filter((value) => value !== null);
const thickerHalf = (values: readonly number[]) => values.slice(Math.floor(values.length / 2));
const isFalling = (values: readonly number[]) => values.length > 1 && values.at(-1)! < values[0]!;
