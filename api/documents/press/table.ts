import { left, room, type Flow } from './flow';
import { body, ink, styles, type Style } from './ink';
import { layRow, splitRow, type LaidRow } from './table-row';
import { printRow } from './table-print';

/** One paragraph of a cell. `goTo` names a place in the document. */
export type Piece = { text: string; style: Style; goTo?: string };
/** A drawing in a cell; `alt` says what it shows to those who do not see it. */
export type Picture = { alt: string; height: number; draw: (x: number, y: number) => void };
/** `span`: how many columns it stands across. */
export type Cell =
  { pieces: Piece[]; picture?: undefined; span?: number } | { pieces?: undefined; picture: Picture; span?: undefined };
/** Widths in points; columns without one share what is left by their `share`. */
export type Column = { title: string; width?: number; share?: number; align?: 'left' | 'right' };
/** `heading`: stands over the rows below it, across the table; `total`: never parted from the row above it; `keep`: not from the one below. */
export type Row = { kind?: 'body' | 'heading' | 'total'; cells: Cell[]; keep?: boolean; destination?: string };
export type Table = { columns: Column[]; rows: Row[]; caption: string; bare?: boolean; padding?: number };
export type Laid = Column & { x: number; inner: number };

export const text = (words: string, style: Style = styles.cell): Cell => ({ pieces: [{ text: words, style }] });
export const across = (words: string, span: number, style: Style = styles.cellStrong): Cell => ({
  pieces: [{ text: words, style }],
  span,
});
export const stack = (...pieces: (Piece | null)[]): Cell => ({ pieces: pieces.flatMap((piece) => piece ?? []) });
export const piece = (words: string, style: Style = styles.cell, goTo?: string): Piece => ({
  text: words,
  style,
  goTo,
});

/** Prints a table: its heads again on every page, rows whole, headings and totals beside their rows. */
export function printTable(flow: Flow, table: Table): void {
  const columns = layColumns(table.columns);
  const rows = table.rows.map((row) => layRow(flow, row, { columns, padding: table.padding ?? 5 }));
  const element = flow.document.struct('Table', { title: table.caption });
  flow.part.add(element);
  const head = () => {
    if (!table.bare) printHead({ flow, element, columns });
  };
  const headHeight = table.bare ? 0 : 19;
  room(flow, headHeight + together(rows, 0));
  head();
  rows.forEach((_, index) => {
    const block = Math.min(together(rows, index), body.bottom - body.top - headHeight);
    if (left(flow) < block) {
      flow.document.addPage();
      flow.y = body.top;
      head();
    }
    printWhole({ flow, element, columns }, rows[index]!, head);
  });
  element.end();
}

export type Printing = { flow: Flow; element: PDFKit.PDFStructureElement; columns: Laid[] };

/** A row that is taller than a page goes on over the next ones. */
function printWhole(printing: Printing, row: LaidRow, head: () => void): void {
  let rest: LaidRow | null = row;
  while (rest) {
    const [now, later]: [LaidRow, LaidRow | null] = splitRow(rest, left(printing.flow));
    printRow(printing, now);
    rest = later;
    if (!rest) return;
    printing.flow.document.addPage();
    printing.flow.y = body.top;
    head();
  }
}

/** Height that must stay together from here on: headings with their first row, a row with the totals under it. */
function together(rows: LaidRow[], from: number): number {
  let height = 0;
  for (let index = from; index < rows.length; index += 1) {
    height += rows[index]!.height;
    const next = rows[index + 1];
    if (!rows[index]!.keep && next?.kind !== 'total') break;
  }
  return height;
}

const gutter = 12;
function layColumns(columns: Column[]): Laid[] {
  const fixed = columns.reduce((sum, { width }) => sum + (width ?? 0), 0) + gutter * (columns.length - 1);
  const shares = columns.reduce((sum, { width, share = 1 }) => sum + (width === undefined ? share : 0), 0);
  let x: number = body.left;
  return columns.map((column) => {
    const inner = column.width ?? ((body.width - fixed) * (column.share ?? 1)) / shares;
    const laid = { ...column, x, inner };
    x += inner + gutter;
    return laid;
  });
}

function printHead({ flow, element, columns }: Printing): void {
  const { document } = flow;
  const row = document.struct('TR');
  element.add(row);
  for (const { title, x, inner, align } of columns) {
    const at = { x: align === 'right' ? x + inner : x, y: flow.y, style: styles.head, align };
    row.add(document.struct('TH', {}, () => flow.line(title, at)));
  }
  row.end();
  flow.y += 15;
  document.moveTo(body.left, flow.y).lineTo(body.right, flow.y).lineWidth(0.9).stroke(ink.text);
  flow.y += 4;
}
