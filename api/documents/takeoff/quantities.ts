import { countWords } from '@/api/contracts/run-words';
import { closePart, gap, openPart, paragraph, subheading } from '@/api/documents/press/flow';
import { styles } from '@/api/documents/press/ink';
import { across, piece, printTable, stack, text, type Column, type Row } from '@/api/documents/press/table';

import { numberRanges } from './number-ranges';
import {
  areaDigits,
  lengthDigits,
  thicknessLabel,
  type PrintedKind,
  type PrintedLine,
  type Sums,
} from './printed-quantities';
import { shortName } from './schedule-words';
import type { Sheet } from './sheet';

const kindWords = { pipe: 'Pipes and tubes', duct: 'Ducts', equipment: 'Equipment' } as const;

/** Net quantities by service, size and thickness; each line rounded once, each total the sum of its lines. */
export function printQuantities(sheet: Sheet): void {
  const { flow, quantities } = sheet;
  openPart(flow, 'Quantities', 200);
  const words = `Net, as measured on the drawings named. Each line is rounded once, lengths to 0.1 m and areas to 0.01 m²; every total adds the printed lines. Runs by others and on hold are told apart below.`;
  paragraph(flow, words, { style: styles.bodySoft });
  if (quantities.length === 0) paragraph(flow, 'Nothing is measured yet.', { style: styles.body });
  for (const kind of quantities) printKind(sheet, kind);
  printFittings(sheet);
  closePart(flow);
}

type Printing = { sheet: Sheet; kind: PrintedKind };

function printKind(sheet: Sheet, kind: PrintedKind): void {
  const { flow } = sheet;
  const printing = { sheet, kind };
  const title = kindWords[kind.kind];
  gap(flow, 4);
  subheading(flow, title, { least: 130 });
  const rows = kind.services.flatMap(({ service, lines, sums }): Row[] => [
    { kind: 'heading', cells: [text(service, styles.cellStrong)] },
    ...lines.map((line) => lineRow(printing, line)),
    ...(lines.length > 1 ? [sumRow(printing, `${service}, sum`, sums)] : []),
  ]);
  const total = sumRow(printing, `${title}, total`, kind.sums);
  printTable(flow, { caption: title, padding: 3.5, columns: columnsFor(printing), rows: [...rows, total] });
  if (kind.byThickness.length > 1) printThicknesses(printing);
}

/** The amounts that a kind has, in the order of its columns. */
function measures({ sheet: { locale }, kind: { sums } }: Printing) {
  const all = [
    { has: sums.length !== null, title: 'length m', width: 44, show: (of: Sums) => shown(of.length, lengthDigits) },
    { has: sums.area !== null, title: 'surface m²', width: 50, show: (of: Sums) => shown(of.area, areaDigits) },
    { has: sums.count !== null, title: 'pieces', width: 38, show: (of: Sums) => shown(of.count, 0) },
  ];
  const shown = (value: number | null, digits: number) => (value === null ? '' : locale.number(value, digits));
  return all.filter(({ has }) => has);
}

const right = { align: 'right' as const };
const columnsFor = (printing: Printing): Column[] => [
  { title: 'Size', share: printing.kind.kind === 'equipment' ? 1.9 : 0.95 },
  { title: 'Material and finish', share: 1.9 },
  { title: 'mm', width: 38, ...right },
  ...measures(printing).map(({ title, width }) => ({ title, width, ...right })),
  { title: 'Runs and fittings', share: 1.9 },
];

function lineRow(printing: Printing, printed: PrintedLine): Row {
  const { line } = printed;
  const fittings = line.fittings.filter(({ count }) => count > 0).map(({ kind, count }) => countWords(kind, count));
  return {
    cells: [
      text(line.size),
      stack(piece(shortName(line.material)), piece(shortName(line.finish), styles.cellSoft)),
      text(thicknessLabel(line), styles.cellStrong),
      ...measures(printing).map(({ show }) => text(show(printed))),
      stack(
        piece(numberRanges(line.runNumbers), styles.cellSoft),
        fittings.length > 0 ? piece(fittings.join(', '), styles.cellSoft) : null,
      ),
    ],
  };
}

const sumRow = (printing: Printing, words: string, sums: Sums): Row => ({
  kind: 'total',
  cells: [across(words, 3), ...measures(printing).map(({ show }) => text(show(sums), styles.cellStrong)), text('')],
});

function printThicknesses(printing: Printing): void {
  const { sheet, kind } = printing;
  gap(sheet.flow, 4);
  subheading(sheet.flow, `${kindWords[kind.kind]} by material and thickness`, { tag: 'H4' });
  const rows: Row[] = kind.byThickness.map(({ material, thickness, sums }) => ({
    cells: [
      across(shortName(material), 2, styles.cell),
      text(thickness, styles.cellStrong),
      ...measures(printing).map(({ show }) => text(show(sums))),
      text(''),
    ],
  }));
  const titles: Record<string, string> = { Size: 'Material', 'Material and finish': '', 'Runs and fittings': '' };
  const columns = columnsFor(printing).map((column) => ({ ...column, title: titles[column.title] ?? column.title }));
  const total = sumRow(printing, 'Total', kind.sums);
  printTable(sheet.flow, { caption: 'By material and thickness', padding: 2.5, columns, rows: [...rows, total] });
}

function printFittings({ flow, snapshot, locale }: Sheet): void {
  const fittings = snapshot.takeoff.fittings.filter(({ count }) => count > 0);
  if (fittings.length === 0) return;
  gap(flow, 4);
  subheading(flow, 'Fittings and supports, counted');
  paragraph(
    flow,
    fittings.map(({ kind, count }) => countWords(kind, count).replace(/^\d+/, locale.number(count, 0))).join(' · '),
    { style: styles.body },
  );
}
