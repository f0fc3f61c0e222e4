import { hairline } from './flow';
import { body, ink } from './ink';
import type { Laid, Printing } from './table';
import type { LaidCell, LaidLine, LaidRow } from './table-row';

export function printRow(printing: Printing, row: LaidRow): void {
  const { flow, element } = printing;
  const { document } = flow;
  if (row.kind === 'total') hairline(flow, flow.y, { colour: ink.text, width: 0.9 });
  if (row.destination) document.addNamedDestination(row.destination, 'XYZ', body.left, flow.y - 8, 0);
  const tableRow = document.struct('TR');
  element.add(tableRow);
  for (const cell of row.cells) {
    const data = document.struct(row.kind === 'heading' ? 'TH' : 'TD');
    tableRow.add(data);
    printCell({ flow, element: data }, cell, flow.y + row.padding);
    data.end();
  }
  tableRow.end();
  flow.y += row.height;
  if (row.kind !== 'heading') hairline(flow, flow.y);
}

type InCell = Pick<Printing, 'flow' | 'element'>;
function printCell({ flow, element }: InCell, { column, lines, picture }: LaidCell, top: number): void {
  const { document } = flow;
  let y = top;
  if (picture) {
    const drawn = document.struct('Figure', { alt: picture.alt }, () => picture.draw(column.x, top));
    element.add(drawn);
  }
  for (const group of grouped(lines)) {
    printGroup({ flow, element }, group, { column, y });
    y += group.reduce((sum, { style }) => sum + style.leading, 0);
  }
}

type Where = { column: Laid; y: number };
/** Lines that are a link stand in an element of their own, which names where it leads. */
function printGroup({ flow, element }: InCell, lines: LaidLine[], where: Where): void {
  const link = lines[0]?.goTo ? flow.document.struct('Link') : undefined;
  if (link) element.add(link);
  (link ?? element).add(() => printLines(flow, lines, { ...where, link }));
  link?.end();
}

type Printed = Where & { link?: PDFKit.PDFStructureElement };
function printLines(flow: Printing['flow'], lines: LaidLine[], { column, y, link }: Printed): void {
  const { x, inner, align } = column;
  let top = y;
  for (const { text, style, goTo } of lines) {
    flow.line(text, { x: align === 'right' ? x + inner : x, y: top, style, align, goTo, link });
    top += style.leading;
  }
}

/** Lines in a row that are, or are not, the same link. */
function grouped(lines: LaidLine[]): LaidLine[][] {
  const groups: LaidLine[][] = [];
  for (const line of lines) {
    const last = groups.at(-1);
    if (last && last[0]?.goTo === line.goTo) last.push(line);
    else groups.push([line]);
  }
  return groups;
}
