type Point = readonly [x: number, y: number];
type Pen = { x: number; y: number };

/** Points through which a path of our geometry goes: ends of lines, and of an arc its end, so half circles give both sides. */
export function pointsOf(path: string): Point[] {
  const pen: Pen = { x: 0, y: 0 };
  const points: Point[] = [];
  for (const [, letter, rest] of path.matchAll(/([MLHVAahZ])([^MLHVAahZ]*)/g)) {
    if (letter === 'Z') continue;
    move(pen, letter!, rest!.trim().split(/[ ,]+/).map(Number));
    points.push([pen.x, pen.y]);
  }
  return points;
}

function move(pen: Pen, letter: string, numbers: number[]): void {
  const [x, y] = [numbers.at(-2)!, numbers.at(-1)!];
  if (letter === 'M' || letter === 'L' || letter === 'A') Object.assign(pen, { x, y });
  else if (letter === 'a') Object.assign(pen, { x: pen.x + x, y: pen.y + y });
  else if (letter === 'H') pen.x = y;
  else if (letter === 'V') pen.y = y;
  else if (letter === 'h') pen.x += y;
  else throw new Error(`The geometry does not write ${letter}`);
}

/** What an outline covers; a circle is written as two half circles from its left to its right and back. */
export function outlineBox(path: string) {
  const points = pointsOf(path);
  const radius = /A([\d.]+) /.exec(path)?.[1];
  const ys = points.map(([, y]) => y);
  const [left, right] = [Math.min(...points.map(([x]) => x)), Math.max(...points.map(([x]) => x))];
  const [top, bottom] = radius
    ? [ys[0]! - Number(radius), ys[0]! + Number(radius)]
    : [Math.min(...ys), Math.max(...ys)];
  return { left, right, top, bottom, width: right - left, height: bottom - top };
}

type Sides = Pick<ReturnType<typeof outlineBox>, 'left' | 'right' | 'top' | 'bottom'>;

/** Whether a point lies in a box by at least `by`. */
export const isWithin = ({ left, right, top, bottom }: Sides, [x, y]: Point, by: number): boolean =>
  x > left + by && x < right - by && y > top + by && y < bottom - by;
