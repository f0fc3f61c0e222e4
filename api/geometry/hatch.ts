import { along, at, boxOf, holds, rounded, stretchesIn, type Point, type Region } from './outlines';
import { marksOf, slanted, type Marks, type Pattern } from './patterns';

/** A material's hatch as one path, inside its region by construction: no clipping is left to whoever draws it. */
export function hatch(region: Region, pattern: Pattern, pitch: number): string {
  return drawn(region, marksOf[pattern](boxOf(region.outer), pitch));
}

/** What flows, and the metal around it: close lines at 45°. */
export const boreHatch = (region: Region, pitch: number): string =>
  drawn(region, { lines: slanted(boxOf(region.outer), pitch, 1), dots: [], dotRadius: 0 });

function drawn(region: Region, { lines, dots, dotRadius }: Marks): string {
  const paths = lines.map((line) => cut(region, line));
  const marks = dots.filter((dot) => holds(region, dot, dotRadius + 0.6)).map((dot) => mark(dot, dotRadius));
  return [...paths, ...marks].join('');
}

/** A line of several points, cut where it leaves the region; parts that meet stay one stroke. */
function cut(region: Region, line: readonly Point[]): string {
  let path = '';
  let end = '';
  for (let index = 1; index < line.length; index++) {
    const [from, to] = [line[index - 1]!, line[index]!];
    for (const [start, stop] of stretchesIn(region, from, to)) {
      const [first, last] = [at(along(from, to, start)), at(along(from, to, stop))];
      if (first === last) continue;
      path += first === end ? `L${last}` : `M${first}L${last}`;
      end = last;
    }
  }
  return path;
}

/** A dot is a stroke of no length with a round end; a ring is drawn. */
function mark([x, y]: Point, radius: number): string {
  if (radius === 0) return `M${at([x, y])}h0.01`;
  const r = rounded(radius);
  return `M${at([x - r, y])}a${r} ${r} 0 1 1 ${rounded(2 * r)} 0a${r} ${r} 0 1 1 ${rounded(-2 * r)} 0`;
}
