import { closePart, gap, hairline, paragraph, printLines, tagged } from '@/api/documents/press/flow';
import { body, styles } from '@/api/documents/press/ink';

import { printBasis } from './basis';
import type { PrintedKind } from './printed-quantities';
import { printSectionLine } from './section-line';
import type { Sheet } from './sheet';

/** What an outsider needs first: what is insulated, for whom, how much, and what it stands on. */
export function printFirstPage(sheet: Sheet): void {
  const { flow, snapshot, locale } = sheet;
  const { job } = snapshot;
  flow.part = flow.document.struct('Sect', { title: 'Insulation takeoff' });
  flow.root.add(flow.part);
  flow.document.outline.addItem('Insulation takeoff', { expanded: false });
  tagged(flow, 'P', () =>
    printLines(flow, 'Insulation takeoff and schedule', {
      style: { ...styles.subheading, colour: styles.note.colour },
    }),
  );
  gap(flow, 2);
  tagged(flow, 'H1', () => printLines(flow, job.name, { style: styles.title }));
  if (job.site) paragraph(flow, job.site, { style: styles.bodySoft });
  gap(flow, 8);
  if (job.scope) paragraph(flow, job.scope, { style: styles.lead, width: body.width * 0.86 });
  gap(flow, 14);
  printPeople(sheet);
  printFigures(sheet);
  printSectionLine(sheet);
  closePart(flow);
  printBasis({ flow, snapshot, locale });
}

type Fact = { title: string; lines: string[] };

function printPeople({ flow, snapshot, locale }: Sheet): void {
  const { to, preparedBy, job } = snapshot;
  const due = job.bidDue && `${locale.date(job.bidDue.date)}, ${job.bidDue.time} (${job.bidDue.zone})`;
  const facts: Fact[] = [
    {
      title: 'For',
      lines:
        to.length > 0
          ? to.map(({ name, company }) => [name, company].filter(Boolean).join(', '))
          : ['nobody named yet'],
    },
    { title: 'Prepared by', lines: [preparedBy.name, preparedBy.email] },
    { title: 'Bid due', lines: [due ?? 'no date given'] },
  ];
  const width = (body.width - 40) / 3;
  const top = flow.y;
  const ends = facts.map(({ title, lines }, index) => {
    const x = body.left + index * (width + 20);
    flow.y = top;
    tagged(flow, 'P', () => {
      printLines(flow, title, { style: styles.head, x, width });
      for (const line of lines) printLines(flow, line, { style: styles.body, x, width });
    });
    return flow.y;
  });
  flow.y = Math.max(...ends) + 14;
}

/** The job in four numbers, each the sum of the lines printed below. */
function printFigures({ flow, quantities, clarifications, locale }: Sheet): void {
  const figures = [...quantities.flatMap((kind) => figureOf(kind, locale)), clarificationFigure(clarifications.length)];
  const width = body.width / figures.length;
  hairline(flow, flow.y);
  const top = flow.y + 10;
  figures.forEach(([value, words], index) => {
    const x = body.left + index * width;
    flow.y = top;
    tagged(flow, 'P', () => {
      printLines(flow, value, { style: styles.figure, x, width: width - 8 });
      printLines(flow, words, { style: styles.note, x, width: width - 14 });
    });
  });
  flow.y = top + 50;
  hairline(flow, flow.y);
}

type Figure = [value: string, words: string];
function figureOf({ kind, sums }: PrintedKind, locale: Sheet['locale']): Figure[] {
  if (kind === 'pipe') return [[`${locale.number(sums.length ?? 0, 1)} m`, 'of pipe and tube, net']];
  if (kind === 'duct') return [[`${locale.number(sums.area ?? 0, 2)} m²`, 'finished surface of ducts']];
  const pieces = sums.count ?? 0;
  return [
    [
      sums.area === null ? locale.number(pieces, 0) : `${locale.number(sums.area, 2)} m²`,
      sums.area === null ? 'pieces of equipment' : `finished surface of equipment, ${pieces} pieces`,
    ],
  ];
}

const clarificationFigure = (count: number): Figure => [
  String(count),
  count === 1 ? 'clarification to read' : 'clarifications to read',
];
