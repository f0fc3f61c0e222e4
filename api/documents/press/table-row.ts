import type { Flow } from './flow';
import { styles, type Style } from './ink';
import type { Cell, Laid, Picture, Row } from './table';

export type LaidLine = { text: string; style: Style; goTo?: string };
export type LaidCell = { column: Laid; lines: LaidLine[]; picture: Picture | null };
export type LaidRow = {
  kind: 'body' | 'heading' | 'total';
  cells: LaidCell[];
  padding: number;
  height: number;
  keep: boolean;
  destination?: string;
};

type Grid = { columns: Laid[]; padding: number };

export function layRow(
  flow: Flow,
  { kind = 'body', cells, keep, destination }: Row,
  { columns, padding }: Grid,
): LaidRow {
  let next = 0;
  const laid = cells.map((cell) => {
    const from = next;
    next += kind === 'heading' ? columns.length : (cell.span ?? 1);
    return layCell(flow, cell, merged(columns.slice(from, next)));
  });
  const room = kind === 'heading' ? Math.max(padding, 4) : padding;
  return {
    kind,
    cells: laid,
    padding: room,
    height: heightOf(laid, room),
    keep: keep ?? kind === 'heading',
    destination,
  };
}

function merged(columns: Laid[]): Laid {
  const [first, last] = [columns[0], columns.at(-1)];
  if (!first || !last) throw new Error('A row has more cells than its table has columns');
  return { ...first, inner: last.x + last.inner - first.x };
}

function layCell(flow: Flow, { pieces = [], picture }: Cell, column: Laid): LaidCell {
  const lines = pieces.flatMap(({ text, style, goTo }) =>
    flow.wrap.lines(text, style, column.inner).map((line) => ({ text: line, style, goTo })),
  );
  return { column, lines, picture: picture ?? null };
}

const linesHeight = (lines: LaidLine[]) => lines.reduce((sum, { style }) => sum + style.leading, 0);
const cellHeight = ({ lines, picture }: LaidCell) => Math.max(linesHeight(lines), picture?.height ?? 0);
const heightOf = (cells: LaidCell[], padding: number) =>
  Math.max(styles.cell.leading, ...cells.map(cellHeight)) + 2 * padding;

/** What fits into `room`, and the rest; a row that fits stays whole. */
export function splitRow(row: LaidRow, room: number): [LaidRow, LaidRow | null] {
  if (row.height <= room) return [row, null];
  const cut = row.cells.map(({ lines }) => countFitting(lines, room - 2 * row.padding));
  const first = row.cells.map((cell, index) => ({ ...cell, lines: cell.lines.slice(0, cut[index]) }));
  const rest = row.cells.map((cell, index) => ({ ...cell, lines: cell.lines.slice(cut[index]), picture: null }));
  if (rest.every(({ lines }) => lines.length === 0)) return [{ ...row, cells: first }, null];
  return [
    { ...row, cells: first, height: heightOf(first, row.padding) },
    { ...row, cells: rest, height: heightOf(rest, row.padding), destination: undefined },
  ];
}

function countFitting(lines: LaidLine[], room: number): number {
  let height = 0;
  const over = lines.findIndex(({ style }) => (height += style.leading) > room);
  return over < 0 ? lines.length : Math.max(over, 1);
}
