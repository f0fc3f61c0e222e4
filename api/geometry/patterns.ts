import type { Box, Point } from './outlines';

/** How a family of materials is hatched, so that black and white tells them apart. */
export const patterns = [
  'waves',
  'loose-waves',
  'waves-and-lines',
  'cells',
  'dots',
  'rings',
  'strokes',
  'grains',
  'crosses',
  'dashes',
  'lines',
] as const;
export type Pattern = (typeof patterns)[number];

const families: Record<string, Pattern> = {
  mf_pipe: 'waves',
  mw_high_temperature: 'waves',
  mf_blanket_wrap: 'loose-waves',
  htf_blanket: 'loose-waves',
  glass_needle_mat: 'loose-waves',
  mf_board: 'waves-and-lines',
  duct_liner: 'waves-and-lines',
  cellular_glass: 'cells',
  elastomeric: 'dots',
  polyolefin: 'rings',
  melamine: 'rings',
  calsil: 'strokes',
  perlite: 'grains',
  vermiculite: 'grains',
  phase_cork: 'grains',
  pir: 'crosses',
  pur: 'crosses',
  phenolic: 'crosses',
  eps: 'crosses',
  xps: 'crosses',
  microporous: 'dashes',
  aerogel: 'dashes',
};

/** A firm's own material, of which no family is known, gets plain lines. */
export const patternOf = (materialId: string): Pattern => families[materialId.replace(/^std\//, '')] ?? 'lines';

/** Lines that are cut where the region ends, and round marks that are left out unless they fit as a whole. */
export type Marks = { lines: Point[][]; dots: Point[]; dotRadius: number };
type Draw = (box: Box, pitch: number) => Marks;

const onlyLines = (lines: Point[][]): Marks => ({ lines, dots: [], dotRadius: 0 });

export const marksOf: Record<Pattern, Draw> = {
  waves: (box, pitch) => onlyLines(waves(box, { pitch, height: 0.16 * pitch, length: pitch })),
  'loose-waves': (box, pitch) =>
    onlyLines(waves(box, { pitch: 1.1 * pitch, height: 0.4 * pitch, length: 2.2 * pitch, turned: true })),
  'waves-and-lines': (box, pitch) =>
    onlyLines([...waves(box, { pitch: 1.6 * pitch, height: 0.2 * pitch, length: pitch }), ...levels(box, 1.6 * pitch)]),
  cells: (box, pitch) => onlyLines(cells(box, 0.62 * pitch)),
  dots: (box, pitch) => ({ lines: [], dots: staggered(box, 0.72 * pitch), dotRadius: 0 }),
  rings: (box, pitch) => ({ lines: [], dots: staggered(box, pitch), dotRadius: 0.24 * pitch }),
  strokes: (box, pitch) => onlyLines(staggered(box, 0.8 * pitch).map((point) => stroke(point, 0.3 * pitch))),
  grains: (box, pitch) => onlyLines(staggered(box, pitch).map((point) => grain(point, 0.26 * pitch))),
  crosses: (box, pitch) => onlyLines([...slanted(box, 1.3 * pitch, 1), ...slanted(box, 1.3 * pitch, -1)]),
  dashes: (box, pitch) =>
    onlyLines(
      staggered(box, 0.6 * pitch).map(([x, y]) => [
        [x - 0.2 * pitch, y],
        [x + 0.2 * pitch, y],
      ]),
    ),
  lines: (box, pitch) => onlyLines(slanted(box, 1.1 * pitch, -1)),
};

/** Multiples of a step on both sides of the middle, so that a hatch stands still while its section grows around it. */
function steps(from: number, length: number, step: number): number[] {
  const middle = from + length / 2;
  const count = Math.ceil(length / 2 / step);
  return Array.from({ length: 2 * count + 1 }, (_, index) => middle + (index - count) * step);
}

type Wave = { pitch: number; height: number; length: number; turned?: boolean };
function waves({ x, y, width, height }: Box, wave: Wave): Point[][] {
  return steps(y, height, wave.pitch).map((level, row) =>
    steps(x, width, wave.length / 2).map((across, index) => {
      const up = (index + (wave.turned ? row : 0)) % 2 === 0;
      return [across, level + (up ? -wave.height : wave.height)];
    }),
  );
}

const levels = ({ x, y, width, height }: Box, pitch: number): Point[][] =>
  steps(y, height, pitch).map((level) => [
    [x, level + pitch / 2],
    [x + width, level + pitch / 2],
  ]);

/** Straight lines at 45°, rising for 1 and falling for -1. */
export function slanted({ x, y, width, height }: Box, pitch: number, rise: 1 | -1): Point[][] {
  const [middle, half] = [y + height / 2, (width + height) / 2];
  return steps(x + width / 2 - half, 2 * half, pitch * Math.SQRT2).map((across) => [
    [across - rise * half, middle + half],
    [across + rise * half, middle - half],
  ]);
}

const staggered = ({ x, y, width, height }: Box, pitch: number): Point[] =>
  steps(y, height, pitch).flatMap((level, row) =>
    steps(x, width, pitch).map((across): Point => [across + (row % 2 ? pitch / 2 : 0), level]),
  );

/** Honeycomb: in each row the zigzag between two rows of cells, and the walls that go down from it. */
function cells({ x, y, width, height }: Box, side: number): Point[][] {
  const across = side * Math.sqrt(3);
  return steps(y, height, 1.5 * side).flatMap((level, row) => {
    const shift = row % 2 ? across / 2 : 0;
    const columns = steps(x, width, across).map((column) => column + shift);
    const zigzag = columns.flatMap((column): Point[] => [
      [column, level],
      [column + across / 2, level - side / 2],
    ]);
    const walls = columns.map((column): Point[] => [
      [column, level],
      [column, level + side],
    ]);
    return [zigzag, ...walls];
  });
}

/** A number from 0 to 1 that looks thrown but is the same every time. */
const thrown = ([x, y]: Point): number => {
  const wild = Math.sin(Math.round(x) * 12.9898 + Math.round(y) * 78.233) * 43758.5453;
  return wild - Math.floor(wild);
};

function stroke(point: Point, reach: number): Point[] {
  const angle = Math.PI * thrown(point);
  const [dx, dy] = [reach * Math.cos(angle), reach * Math.sin(angle)];
  return [
    [point[0] - dx, point[1] - dy],
    [point[0] + dx, point[1] + dy],
  ];
}

function grain(point: Point, reach: number): Point[] {
  const turn = 2 * Math.PI * thrown(point);
  return [0, 1, 2, 3].map((corner): Point => {
    const angle = turn + (corner * 2 * Math.PI) / 3;
    return [point[0] + reach * Math.cos(angle), point[1] + reach * Math.sin(angle)];
  });
}
