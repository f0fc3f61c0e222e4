import type { Run } from '@/api/contracts/run';
import { lengthOf, sizeText, statusWords } from '@/api/contracts/run-words';
import { thicknessText } from '@/api/contracts/words-text';
import { closePart, openPart, paragraph } from '@/api/documents/press/flow';
import { styles } from '@/api/documents/press/ink';
import { piece, printTable, stack, text, type Row } from '@/api/documents/press/table';

import { numberRanges } from './number-ranges';
import { shortName } from './schedule-words';
import type { Sheet } from './sheet';

/** Runs that depart from the specification, each with the reason that was given. */
export function printOverrides(sheet: Sheet): void {
  const { flow, snapshot } = sheet;
  const overridden = snapshot.runs.filter(({ override }) => override !== null);
  if (overridden.length === 0) return;
  openPart(flow, 'Departures from the specification', 110);
  const rows = alike(overridden, (run) => JSON.stringify(departureOf(sheet, run))).map((runs): Row => {
    const { service, size, layers, finish, reasons } = departureOf(sheet, runs[0]!);
    return {
      cells: [
        text(numberRanges(runs.map(({ number }) => number)), styles.cellStrong),
        stack(piece(service), piece(size, styles.cellSoft)),
        stack(piece(layers || '–'), finish ? piece(finish, styles.cellSoft) : null),
        stack(...reasons.map((words, index) => piece(words, index === 0 ? styles.cell : styles.cellSoft))),
      ],
    };
  });
  const columns = [
    { title: 'Runs', width: 74 },
    { title: 'Service and size' },
    { title: 'Put up' },
    { title: 'Reason given', share: 1.5 },
  ];
  printTable(flow, { caption: 'Departures', columns, rows });
  closePart(flow);
}

/** How a run departs, in words: runs that read alike are printed once. */
function departureOf(sheet: Sheet, run: Run) {
  const assembly = sheet.snapshot.judged.find(({ runId }) => runId === run.id)?.assembly;
  const layers = assembly?.layers.map(
    ({ materialName, thickness }) =>
      `${shortName(materialName)}${thickness ? ` ${thicknessText([thickness], 'SI')}` : ''}`,
  );
  return {
    service: serviceOf(sheet, run),
    size: sizeOf(sheet, run),
    layers: layers?.join(' + ') ?? '',
    finish: shortName(assembly?.finishName ?? ''),
    reasons: [run.override?.reason ?? '', ...otherChanges(run, sheet.locale)],
  };
}

function alike<Item>(items: Item[], key: (item: Item) => string): Item[][] {
  const groups = new Map<string, Item[]>();
  for (const item of items) {
    const words = key(item);
    const group = groups.get(words);
    if (group) group.push(item);
    else groups.set(words, [item]);
  }
  return [...groups.values()];
}

function otherChanges({ override }: Run, locale: Sheet['locale']): string[] {
  const state = override?.state;
  const temperatures =
    state &&
    `own temperatures: ${locale.withUnit('temperature', state.lowest.value)}, ${locale.withUnit('temperature', state.operating.value)}, ${locale.withUnit('temperature', state.highest.value)} (lowest, operating, highest)`;
  const exempt = override?.codeExempt && `energy code does not apply: ${override.codeExempt}`;
  return [temperatures, exempt].flatMap((words) => words || []);
}

/** Runs that are not to be started, assumed, or left to others: told apart, with who says so. */
export function printHolds(sheet: Sheet): void {
  const { flow, snapshot } = sheet;
  const apart = snapshot.runs.filter(({ status }) => status !== 'measured');
  if (apart.length === 0) return;
  openPart(flow, 'On hold, assumed and by others', 110);
  paragraph(
    flow,
    'Runs on hold are counted and not to be started until the hold is lifted. Runs by others are not part of the quantities.',
    { style: styles.bodySoft },
  );
  flow.y += 6;
  const rows = apart.map((run): Row => ({
    cells: [
      text(run.number, styles.cellStrong),
      stack(piece(serviceOf(sheet, run)), piece(sizeOf(sheet, run), styles.cellSoft)),
      text(lengthText(sheet, run)),
      stack(
        piece(statusWords[run.status], styles.cellStrong),
        run.hold ? piece(`${run.hold.reason}. Placed by ${run.hold.by}.`) : null,
        run.note ? piece(run.note, styles.cellSoft) : null,
      ),
    ],
  }));
  const columns = [
    { title: 'Run', width: 44 },
    { title: 'Service and size' },
    { title: 'length m', width: 50, align: 'right' as const },
    { title: 'State and reason', share: 1.8 },
  ];
  printTable(flow, { caption: 'On hold, assumed and by others', columns, rows });
  closePart(flow);
}

const lengthText = ({ locale }: Sheet, { shape }: Run) => {
  const length = lengthOf(shape);
  return length === null ? '–' : locale.number(length, 1);
};
/** As the takeoff names it, else by its own standard. */
const sizeOf = ({ snapshot }: Sheet, { id, shape }: Run) =>
  snapshot.takeoff.lines.find(({ runIds }) => runIds.includes(id))?.size ?? sizeText(shape, 'SI');
const serviceOf = ({ snapshot }: Sheet, { serviceId }: Run) =>
  snapshot.services.find(({ id }) => id === serviceId)?.name ?? '–';
