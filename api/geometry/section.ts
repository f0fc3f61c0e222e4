import { boreHatch, hatch } from './hatch';
import { boxOf, outlinePath, rounded, type Box, type Outline, type Region } from './outlines';
import { patternOf, type Pattern } from './patterns';

/** What is cut, in m from the pipe outwards: a cylinder's width and height are its outside diameter. */
export type SectionInput = {
  shape: 'cylinder' | 'rectangle' | 'wall';
  width: number;
  height: number;
  layers: readonly { materialId: string; thickness: number }[];
  nature: 'hot' | 'cold';
};

export type DrawnLayer = { materialId: string; pattern: Pattern; outline: string; hatch: string; hatchPen: number };

/** Paths in a square of `size`, and the widths of the pens for them; every hatch is a stroke with round ends. */
export type SectionDrawing = {
  size: number;
  /** drawing units per m */
  scale: number;
  nature: 'hot' | 'cold';
  /** pipe, duct or plate with what flows in it: filled with paper, hatched in the ink of its nature */
  bore: { outline: string; hatch: string };
  layers: DrawnLayer[];
  /** the finish, the strongest line */
  jacket: string;
  /** what the whole section covers of the square; its lower edge stands on a base line */
  box: { x: number; y: number; width: number; height: number };
  /** where each layer begins and the last one ends on the level line through the middle, from the bore to the right */
  interfaces: number[];
  pens: { jacket: number; outline: number; wall: number; hatch: number };
};

/** A section fitted to a square of `size`: 28 beside a run, 120 on a card, 280 in a study. */
export function section(drawn: SectionInput, size: number): SectionDrawing {
  const extent = extentOf(drawn);
  return draw(drawn, { size, scale: (size - 2 * marginOf(size)) / Math.max(extent.width, extent.height) });
}

/**
 * A section at a given scale, in the smallest square that takes it: for several side by side.
 *
 * @param scale - drawing units per m
 * @param detail - side of a square for which pens and hatches are chosen, so that neighbours look alike; else its own
 */
export function sectionToScale(drawn: SectionInput, scale: number, detail?: number): SectionDrawing {
  const extent = extentOf(drawn);
  const side = Math.max(extent.width, extent.height) * scale;
  return draw(drawn, { size: side + 2 * marginOf(detail ?? side), scale, detail });
}

/** Of a wall a piece is cut out: its height, and the plate, which no run tells [m]. */
const cutHeight = 0.2;
const plate = 0.012;

/** The finished section's outer measures [m]. */
export function extentOf({ shape, width, height, layers }: SectionInput): { width: number; height: number } {
  const total = layers.reduce((sum, { thickness }) => sum + thickness, 0);
  if (shape === 'wall') return { width: plate + total, height: cutHeight };
  return { width: width + 2 * total, height: height + 2 * total };
}

const marginOf = (size: number) => (size <= 48 ? 1 : 1.5);
const pensOf = (size: number) =>
  size <= 48
    ? { jacket: 1, outline: 0.7, wall: 1, hatch: 0.6 }
    : { jacket: 1.8, outline: 0.8, wall: size <= 160 ? 1.5 : 2.2, hatch: size <= 160 ? 0.7 : 0.8 };
const pitchOf = (size: number) => (size <= 48 ? 4.6 : size <= 160 ? 7 : 10);

type Sheet = { size: number; scale: number; detail?: number };

function draw(drawn: SectionInput, { size, scale, detail = size }: Sheet): SectionDrawing {
  const outlines = outlinesOf(drawn, { size, scale });
  const [bore, outside] = [outlines[0]!, outlines.at(-1)!];
  const [pitch, pens] = [pitchOf(detail), pensOf(detail)];
  return {
    size: rounded(size),
    scale,
    nature: drawn.nature,
    bore: { outline: outlinePath(bore), hatch: boreHatch({ outer: bore, inner: null }, 0.55 * pitch) },
    layers: drawn.layers.map(({ materialId }, index) => {
      const region = regionOf(drawn, outlines[index]!, outlines[index + 1]!);
      const pattern = patternOf(materialId);
      const hatched = {
        hatch: layerHatch(region, pattern, pitch),
        hatchPen: pattern === 'dots' ? 2 * pens.hatch : pens.hatch,
      };
      return { materialId, pattern, outline: outlinePath(region.outer), ...hatched };
    }),
    jacket: drawn.shape === 'wall' ? faceOf(boxOf(outside)) : outlinePath(outside),
    box: wholeBox(drawn, outlines),
    interfaces: outlines.map((outline) => rounded(boxOf(outline).x + boxOf(outline).width)),
    pens,
  };
}

/** Bore first, then where each layer ends. */
function outlinesOf(drawn: SectionInput, { size, scale }: Sheet): Outline[] {
  const ends = drawn.layers.reduce<number[]>((sums, { thickness }) => [...sums, sums.at(-1)! + thickness], [0]);
  const centre = size / 2;
  if (drawn.shape === 'wall') return walls(ends, drawn, { size, scale });
  return ends.map((grown): Outline => {
    const [width, height] = [(drawn.width + 2 * grown) * scale, (drawn.height + 2 * grown) * scale];
    if (drawn.shape === 'cylinder') return { kind: 'circle', x: centre, y: centre, radius: width / 2 };
    return { kind: 'box', x: centre - width / 2, y: centre - height / 2, width, height };
  });
}

/** Plate and layers stand side by side, as high as the piece that is cut out. */
function walls(ends: readonly number[], drawn: SectionInput, { size, scale }: Sheet): Outline[] {
  const { width, height } = extentOf(drawn);
  const left = (size - width * scale) / 2;
  const piece = { kind: 'box' as const, y: (size - height * scale) / 2, height: height * scale };
  return ends.map((end, index) => {
    const start = index === 0 ? -plate : ends[index - 1]!;
    return { ...piece, x: left + (plate + start) * scale, width: (end - start) * scale };
  });
}

const regionOf = ({ shape }: SectionInput, inner: Outline, outer: Outline): Region =>
  shape === 'wall' ? { outer, inner: null } : { outer, inner };

/** Thinner than this a hatch would only be dirt between two lines. */
const thinnest = 2;
function layerHatch(region: Region, pattern: Pattern, pitch: number): string {
  const [outer, inner] = [boxOf(region.outer), region.inner && boxOf(region.inner)];
  const thickness = inner ? (outer.width - inner.width) / 2 : outer.width;
  return thickness < thinnest ? '' : hatch(region, pattern, pitch);
}

const faceOf = ({ x, y, width, height }: Box) => `M${rounded(x + width)} ${rounded(y)}V${rounded(y + height)}`;

function wholeBox({ shape }: SectionInput, outlines: readonly Outline[]): SectionDrawing['box'] {
  const [first, { x, y, width, height }] = [boxOf(outlines[0]!), boxOf(outlines.at(-1)!)];
  const left = shape === 'wall' ? first.x : x;
  return { x: left, y, width: x + width - left, height };
}
