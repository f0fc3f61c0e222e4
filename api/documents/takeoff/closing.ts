import type { UsedStandard } from '@/api/contracts/revision';
import { closePart, gap, openPart, paragraph, room, tagged } from '@/api/documents/press/flow';
import { body, styles } from '@/api/documents/press/ink';
import { piece, printTable, stack, text, type Row } from '@/api/documents/press/table';

import type { Sheet } from './sheet';

const kindWords: Record<UsedStandard['kind'], string> = {
  pipe: 'Pipe size',
  material: 'Material',
  finish: 'Finish',
  code: 'Energy code',
  'made-thickness': 'Made thicknesses',
  safety: 'Touch threshold',
};

/** Every row of the library that a number rests on, with its source and how sure it is. */
export function printStandards(sheet: Sheet): void {
  const { flow, snapshot } = sheet;
  openPart(flow, 'Standards and data used', 120);
  if (snapshot.standards.length === 0) paragraph(flow, 'No row of the library was used.', { style: styles.body });
  else {
    const rows = snapshot.standards.map(({ kind, name, detail, source, confidence }): Row => ({
      cells: [
        text(kindWords[kind], styles.cellSoft),
        stack(piece(name, styles.cellStrong), detail ? piece(detail, styles.cellSoft) : null),
        text(source, styles.cellSoft),
        text(confidence, styles.cellSoft),
      ],
    }));
    const columns = [
      { title: 'Kind', width: 66 },
      { title: 'Row, and what it says', share: 1.2 },
      { title: 'Source', share: 1.2 },
      { title: 'Confidence', width: 96 },
    ];
    printTable(flow, { caption: 'Standards and data used', columns, rows });
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
