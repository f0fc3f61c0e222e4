import { closePart, openPart, paragraph } from '@/api/documents/press/flow';
import { styles } from '@/api/documents/press/ink';
import { piece, printTable, stack, text, type Row } from '@/api/documents/press/table';

import { destinationOf } from './clarifications';
import type { Sheet } from './sheet';

/** What a reader must know before building on the schedule: every flag, numbered. */
export function printClarifications({ flow, clarifications, locale }: Sheet): void {
  openPart(flow, 'Clarifications', 120);
  if (clarifications.length === 0) {
    paragraph(flow, 'Every run meets the limits that apply to it, under the conditions stated.', {
      style: styles.body,
    });
    return closePart(flow);
  }
  const words =
    'Where what is specified or drawn does not meet a limit, or the calculation cannot tell. The takeoff stands as specified unless it says otherwise.';
  paragraph(flow, words, { style: styles.bodySoft });
  flow.y += 8;
  const rows = clarifications.flatMap(({ number, title, entries }): Row[] => [
    {
      kind: 'heading',
      destination: destinationOf(number),
      cells: [stack(piece(`${number}.  ${title}`, styles.subheading))],
    },
    ...entries.map(({ runs, words: sentence }) => ({
      cells: [text(runs, styles.cellStrong), text(locale.words(sentence))],
    })),
  ]);
  const columns = [{ title: 'Runs', width: 120 }, { title: 'What the calculation says' }];
  printTable(flow, { caption: 'Clarifications', columns, rows });
  closePart(flow);
}
