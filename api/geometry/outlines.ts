/** What a section is made of: round, or square-cornered; all of them convex, so a straight line enters and leaves once. */
export type Point = readonly [x: number, y: number];
export type Circle = { kind: 'circle'; x: number; y: number; radius: number };
export type Box = { kind: 'box'; x: number; y: number; width: number; height: number };
export type Outline = Circle | Box;

/** The part of the paper that a hatch may cover: inside `outer`, outside `inner`. */
export type Region = { outer: Outline; inner: Outline | null };
export type Stretch = readonly [from: number, to: number];

export const rounded = (value: number): number => Math.round(value * 10) / 10;
export const at = ([x, y]: Point): string => `${rounded(x)} ${rounded(y)}`;
/** Along the straight line from one point to another: 0 is the first, 1 the second. */
export const along = ([x, y]: Point, [toX, toY]: Point, part: number): Point => [
  x + (toX - x) * part,
  y + (toY - y) * part,
];

export function boxOf(outline: Outline): Box {
  if (outline.kind === 'box') return outline;
  const { x, y, radius } = outline;
  return { kind: 'box', x: x - radius, y: y - radius, width: 2 * radius, height: 2 * radius };
}

/** The outline as a closed path. */
export function outlinePath(outline: Outline): string {
  if (outline.kind === 'box') {
    const { x, y, width, height } = outline;
    return `M${at([x, y])}H${rounded(x + width)}V${rounded(y + height)}H${rounded(x)}Z`;
  }
  const { x, y, radius } = outline;
  const r = rounded(radius);
  const [left, right, level] = [rounded(x) - r, rounded(x) + r, rounded(y)];
  return `M${rounded(left)} ${level}A${r} ${r} 0 1 1 ${rounded(right)} ${level}A${r} ${r} 0 1 1 ${rounded(left)} ${level}Z`;
}

/** The stretches of a straight line that lie in a region. */
export function stretchesIn(region: Region, from: Point, to: Point): Stretch[] {
  const inside = stretchIn(region.outer, from, to);
  const hidden = region.inner && stretchIn(region.inner, from, to);
  if (!inside || !hidden) return inside ? [inside] : [];
  const parts: Stretch[] = [
    [inside[0], Math.min(inside[1], hidden[0])],
    [Math.max(inside[0], hidden[1]), inside[1]],
  ];
  return parts.filter(([start, end]) => end - start > 1e-9);
}

/** Whether a small round mark lies in a region as a whole. */
export function holds(region: Region, point: Point, reach: number): boolean {
  return depth(region.outer, point) >= reach && (!region.inner || depth(region.inner, point) <= -reach);
}

function stretchIn(outline: Outline, from: Point, to: Point): Stretch | null {
  const stretch = outline.kind === 'circle' ? acrossCircle(outline, from, to) : acrossBox(outline, from, to);
  if (!stretch) return null;
  const [start, end] = [Math.max(0, stretch[0]), Math.min(1, stretch[1])];
  return end > start ? [start, end] : null;
}

function acrossCircle({ x, y, radius }: Circle, from: Point, to: Point): Stretch | null {
  const [dx, dy, fx, fy] = [to[0] - from[0], to[1] - from[1], from[0] - x, from[1] - y];
  const square = dx * dx + dy * dy;
  const half = fx * dx + fy * dy;
  const under = half * half - square * (fx * fx + fy * fy - radius * radius);
  if (under <= 0 || square === 0) return null;
  const root = Math.sqrt(under);
  return [(-half - root) / square, (-half + root) / square];
}

function acrossBox({ x, y, width, height }: Box, from: Point, to: Point): Stretch | null {
  const across = slab([from[0], to[0]], [x, x + width]);
  const down = slab([from[1], to[1]], [y, y + height]);
  if (!across || !down) return null;
  return [Math.max(across[0], down[0]), Math.min(across[1], down[1])];
}

function slab([from, to]: Point, [low, high]: Point): Stretch | null {
  if (from === to) return from >= low && from <= high ? [0, 1] : null;
  const [one, other] = [(low - from) / (to - from), (high - from) / (to - from)];
  return [Math.min(one, other), Math.max(one, other)];
}

/** How far a point lies inside (positive) or outside (negative) of an outline. */
function depth(outline: Outline, [px, py]: Point): number {
  if (outline.kind === 'circle') return outline.radius - Math.hypot(px - outline.x, py - outline.y);
  const { x, y, width, height } = outline;
  const [across, down] = [Math.min(px - x, x + width - px), Math.min(py - y, y + height - py)];
  if (across >= 0 && down >= 0) return Math.min(across, down);
  return -Math.hypot(Math.min(across, 0), Math.min(down, 0));
}
