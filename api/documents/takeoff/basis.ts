import { closePart, openPart, paragraph, subheading } from '@/api/documents/press/flow';
import { styles } from '@/api/documents/press/ink';
import { piece, printTable, stack, text, type Row } from '@/api/documents/press/table';

import { codeTitle } from './code-title';
import type { Sheet } from './sheet';

type Basis = Pick<Sheet, 'flow' | 'snapshot' | 'locale'>;

/** What the takeoff stands on: drawings and specification with their revisions, addenda, code, method. */
export function printBasis(basis: Basis): void {
  const { flow, snapshot } = basis;
  openPart(flow, 'What this is based on', 132);
  printTerms(basis);
  subheading(flow, 'Drawings');
  if (snapshot.drawings.length > 0) printDrawings(basis);
  else paragraph(flow, 'No drawings are named.', { style: styles.bodySoft });
  subheading(flow, 'Addenda');
  if (snapshot.addenda.length > 0) printAddenda(basis);
  else paragraph(flow, 'No addenda were received.', { style: styles.bodySoft });
  closePart(flow);
}

function printTerms({ flow, snapshot, locale }: Basis): void {
  const { specification, climateZone, altitude, surfaceMethod } = snapshot.job;
  const dated = specification.date && locale.date(specification.date);
  const title = [specification.number, specification.title, specification.revision, dated].filter(Boolean).join(', ');
  const rows: Row[] = [
    fact('Specification', title || 'none was handed down'),
    fact(
      'Energy code',
      `${codeTitle(snapshot)}, climate zone ${climateZone}. “Meets the table entered” is not a statement of compliance.`,
    ),
    fact(
      'Surface coefficients',
      `${methodWords[surfaceMethod]}; site ${locale.withUnit('altitude', altitude.value)} above sea level; no sun and no clear sky counted.`,
    ),
    fact(
      'Quantities',
      'Net, as measured: no waste, no allowance for fittings. Thicknesses are made sizes by name; areas use made outside diameters.',
    ),
  ];
  printTable(flow, { caption: 'Basis', bare: true, columns: [{ title: '', width: 104 }, { title: '' }], rows });
}

const fact = (name: string, words: string): Row => ({ cells: [text(name, styles.cellStrong), text(words)] });

const methodWords = {
  'astm-c680': 'practice of ASTM C680 (natural and forced convection combined)',
  'iso-12241': 'formulas of ISO 12241',
} as const;

/** Two drawings a line, so that a page holds them. */
function printDrawings({ flow, snapshot, locale }: Basis): void {
  const { drawings } = snapshot;
  const half = Math.ceil(drawings.length / 2);
  const cellsOf = (index: number) => {
    const drawing = drawings[index];
    if (!drawing) return [text(''), text('')];
    const revision = drawing.revision ? `revision ${drawing.revision}` : '';
    const issued = [revision, drawing.date && locale.date(drawing.date), drawing.scale].filter(Boolean).join(', ');
    return [
      text(drawing.number, styles.cellStrong),
      stack(piece(drawing.title || '–'), piece(issued, styles.cellSoft)),
    ];
  };
  const rows: Row[] = Array.from({ length: half }, (_, index) => ({
    cells: [...cellsOf(index), ...cellsOf(index + half)],
  }));
  const columns = [
    { title: 'Number', width: 52 },
    { title: 'Title, revision and date' },
    { title: half < drawings.length ? 'Number' : '', width: 52 },
    { title: half < drawings.length ? 'Title, revision and date' : '' },
  ];
  printTable(flow, { caption: 'Drawings', columns, rows });
}

function printAddenda({ flow, snapshot, locale }: Basis): void {
  const rows: Row[] = snapshot.addenda.map(({ number, date, changes, acknowledged }) => ({
    cells: [
      text(String(number), styles.cellStrong),
      text(locale.date(date)),
      text(changes),
      text(acknowledged ? 'taken in' : 'not yet acknowledged', acknowledged ? styles.cell : styles.cellStrong),
    ],
  }));
  const columns = [
    { title: 'No.', width: 24 },
    { title: 'Date', width: 84 },
    { title: 'What it changes' },
    { title: 'State', width: 84 },
  ];
  printTable(flow, { caption: 'Addenda', columns, rows });
}
