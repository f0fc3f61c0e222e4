import type { StripLayout, StripPoint } from './strip';

/** A level's name: how wide it is when written, and at which end it is looked for first. */
export type LevelName = { id: string; width: number; end: 'left' | 'right' };
export type PlacedName = { id: string; end: 'left' | 'right'; top: number };

type Area = { left: number; right: number; top: number; bottom: number };

const height = 18;
const edge = 8;

/** Where each name stands: at an end of its level, over or under the line, where no number and no other name is. */
export function placeNames(layout: StripLayout, names: readonly LevelName[]): PlacedName[] {
  const taken = layout.curves.flatMap(({ points }) => points.flatMap((point) => (point ? areasOf(point) : [])));
  return names.map(({ id, width, end }) => {
    const y = layout.levels.find((level) => level.id === id)?.y ?? 0;
    const others = layout.levels.filter((level) => level.id !== id).map((level) => level.y);
    const ends = end === 'left' ? (['left', 'right'] as const) : (['right', 'left'] as const);
    const spots = ends.flatMap((at) => [y - height - 2, y + 2].map((top) => ({ id, end: at, top })));
    const areaOf = (spot: PlacedName) => areaAt(spot, { width, whole: layout.width });
    const isFree = (spot: PlacedName) =>
      taken.every((area) => !touches(area, areaOf(spot))) &&
      others.every((other) => other < spot.top || other > spot.top + height);
    const spot = spots.find(isFree) ?? spots[0]!;
    taken.push(areaOf(spot));
    return spot;
  });
}

function areaAt({ end, top }: PlacedName, { width, whole }: { width: number; whole: number }): Area {
  const left = end === 'left' ? edge : whole - edge - width;
  return { left, right: left + width, top, bottom: top + height };
}

/** A point, and the number that goes with it. */
function areasOf({ x, y, off, labelY }: StripPoint): Area[] {
  if (off) return [{ left: x - 16, right: x + 16, top: y - 12, bottom: y + height }];
  return [
    { left: x - 6, right: x + 6, top: y - 6, bottom: y + 6 },
    { left: x - 19, right: x + 19, top: labelY - 9, bottom: labelY + 9 },
  ];
}

const touches = (one: Area, other: Area): boolean =>
  one.left < other.right && other.left < one.right && one.top < other.bottom && other.top < one.bottom;
