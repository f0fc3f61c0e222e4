import type { UsedStandard } from '@/api/contracts/revision';
import { closePart, gap, openPart, paragraph, room, tagged } from '@/api/documents/press/flow';
import { body, styles } from '@/api/documents/press/ink';
import { piece, printTable, stack, text, type Row } from '@/api/documents/press/table';

import type { Sheet } from './sheet';

const kindWords: Record<UsedStandard['kind'], string> = {
  pipe: 'Pipe and tube sizes',
  material: 'Materials',
  finish: 'Finishes',
  code: 'Energy code',
  'made-thickness': 'Made thicknesses',
  safety: 'Touch',
};

const kinds = ['code', 'material', 'finish', 'pipe', 'made-thickness', 'safety'] as const;

function rowsOf(kind: UsedStandard['kind'], standards: UsedStandard[]): Row[] {
  const used = standards.filter((row) => row.kind === kind);
  if (used.length === 0) return [];
  const rows = used.map(({ name, detail, source, confidence }): Row => ({
    cells: [
      stack(piece(name, styles.cell), detail ? piece(detail, styles.note) : null),
      stack(piece(source, styles.note), piece(`Confidence: ${confidence}`, styles.noteStrong)),
    ],
  }));
  return [{ kind: 'heading', cells: [text(kindWords[kind], styles.cellStrong)] }, ...rows];
}

/** Every row of the library that a number rests on, with its source and how sure it is. */
export function printStandards(sheet: Sheet): void {
  const { flow, snapshot } = sheet;
  openPart(flow, 'Standards and data used', 120);
  if (snapshot.standards.length === 0) paragraph(flow, 'No row of the library was used.', { style: styles.body });
  else {
    const rows = kinds.flatMap((kind) => rowsOf(kind, snapshot.standards));
    const columns = [{ title: 'Row, and what it says', share: 0.75 }, { title: 'Source, and how sure it is' }];
    printTable(flow, { caption: 'Standards and data used', padding: 3, columns, rows });
  }
  printColophon(sheet);
  closePart(flow);
}

function printColophon({ flow, snapshot }: Sheet): void {
  gap(flow, 12);
  const replaced = flow.printable.replaced()
    ? ' Signs of names that this type does not have stand as “?”; the record keeps them as entered.'
    : '';
  const made = `Calculated by Thickset, engine ${snapshot.engineVersion}, for steady conditions. Nothing in this document is recalculated after its date.${replaced}`;
  paragraph(flow, made, { style: styles.note });
}

/** What can hurt someone, and who decides. */
export function printCautions({ flow, snapshot }: Sheet): void {
  openPart(flow, 'Cautions', 140);
  for (const caution of snapshot.cautions) {
    room(flow, 2 * styles.body.leading);
    const y = flow.y;
    tagged(flow, 'Lbl', () => flow.line('–', { x: body.left, y, style: styles.bodyStrong }));
    paragraph(flow, caution, { style: styles.body, x: body.left + 14, width: body.width - 14 });
    gap(flow, 4);
  }
  closePart(flow);
}
