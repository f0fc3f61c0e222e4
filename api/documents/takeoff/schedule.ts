import type { ScheduleRow } from '@/api/contracts/schedule';
import { closePart, openPart, paragraph } from '@/api/documents/press/flow';
import { styles } from '@/api/documents/press/ink';
import { piece, printTable, stack, text, type Cell, type Piece, type Row } from '@/api/documents/press/table';

import { destinationOf, numbersFor } from './clarifications';
import { numberRanges } from './number-ranges';
import { inchesOf, retarderWords, shortName, sizesAndThickness, sourceWords, thicknessOf } from './schedule-words';
import { drawSection } from './section-picture';
import type { Sheet } from './sheet';

/** Thickness by service, size and place, each with its source and what decides it. */
export function printSchedule(sheet: Sheet): void {
  const { flow, snapshot } = sheet;
  openPart(flow, 'Schedule of insulation', 220);
  const words =
    'Thickness by service, size and place, each with the limit that decides it. Drawings are to scale, each for itself; every material has its own hatch.';
  paragraph(flow, words, { style: styles.bodySoft });
  if (snapshot.schedule.rows.length === 0) paragraph(flow, 'Nothing is insulated yet.', { style: styles.body });
  else {
    flow.y += 8;
    printTable(flow, {
      caption: 'Schedule of insulation',
      columns,
      rows: snapshot.schedule.rows.map((row) => scheduleRow(sheet, row)),
    });
  }
  closePart(flow);
}

const glyph = 36;
const columns = [
  { title: '', width: glyph },
  { title: 'Service and size', share: 1.1 },
  { title: 'Place and runs', share: 0.9 },
  { title: 'Material and finish', share: 1.15 },
  { title: 'mm', width: 60, align: 'right' as const },
  { title: 'From, and what decides', share: 1.5 },
];

function scheduleRow(sheet: Sheet, row: ScheduleRow): Row {
  const { locale } = sheet;
  const operating = row.operating.map((value) => locale.quantity('temperature', value, 0)).join(' / ');
  return {
    cells: [
      picture(sheet, row),
      stack(
        piece(row.service, styles.cellStrong),
        piece(row.sizes.join(', ')),
        operating ? piece(`operating ${operating} °C`, styles.cellSoft) : null,
      ),
      stack(piece(row.places.join(', ') || '–'), piece(numberRanges(row.runNumbers), styles.cellSoft)),
      materials(row),
      stack(piece(thicknessOf(row), styles.thickness), inchesOf(row) ? piece(inchesOf(row), styles.cellSoft) : null),
      decides(sheet, row),
    ],
  };
}

function picture({ flow }: Sheet, row: ScheduleRow): Cell {
  const { section } = row;
  if (!section) return text('');
  const draw = (x: number, y: number) => drawSection(flow.document, section, { x, y, size: glyph });
  return { picture: { alt: `Section: ${sizesAndThickness(row).replace('\n', ', ')}`, height: glyph, draw } };
}

function materials({ layers, finish, vapourRetarder }: ScheduleRow): Cell {
  const names = [...new Set(layers.map(({ material }) => shortName(material)))];
  const words = retarderWords[vapourRetarder];
  return stack(
    ...names.map((name) => piece(layers.length > 1 && names.length === 1 ? `${name}, ${layers.length} layers` : name)),
    piece(shortName(finish), styles.cellSoft),
    words ? piece(words, styles.cellSoft) : null,
  );
}

function decides({ clarifications, locale }: Sheet, row: ScheduleRow): Cell {
  const links: Piece[] = numbersFor(clarifications, row.runIds).map((number) =>
    piece(`clarification ${number}`, styles.cellLink, destinationOf(number)),
  );
  return stack(
    piece(sourceWords(row)),
    piece(locale.words(row.decides), styles.cellSoft),
    ...row.reasons.map((reason) => piece(reason, styles.cellSoft)),
    ...links,
  );
}
