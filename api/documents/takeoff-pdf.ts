import type { Snapshot } from '@/api/contracts/revision';

import { createLocale } from './locale';
import { openFlow } from './press/flow';
import { bytesOf, openPress } from './press/press';
import { printClarifications } from './takeoff/clarification-list';
import { clarificationsOf } from './takeoff/clarifications';
import { printCautions, printStandards } from './takeoff/closing';
import { printConditions } from './takeoff/conditions';
import { printHolds, printOverrides } from './takeoff/departures';
import { printFirstPage } from './takeoff/first-page';
import { drawDraft, printFrames, titlesOf } from './takeoff/frame';
import { printedQuantities } from './takeoff/printed-quantities';
import { printQuantities } from './takeoff/quantities';
import { printSchedule } from './takeoff/schedule';
import type { Sheet } from './takeoff/sheet';

const parts = [
  printFirstPage,
  printSchedule,
  printClarifications,
  printQuantities,
  printOverrides,
  printHolds,
  printConditions,
  printCautions,
  printStandards,
];

/** A draft says when it was made, since nothing froze it. */
export type Rendering = { draft: false } | { draft: true; at: string };

/** The takeoff document of a snapshot: the same snapshot gives the same bytes. */
export function renderTakeoff(snapshot: Snapshot, rendering: Rendering): Promise<Buffer> {
  const draftAt = rendering.draft ? rendering.at : null;
  const locale = createLocale(snapshot.letterhead.locale, snapshot.timeZone);
  const titles = titlesOf(snapshot, locale, draftAt);
  const press = openPress({
    title: `${titles.issue}, ${snapshot.job.name}`,
    author: snapshot.letterhead.name,
    subject: 'Insulation takeoff and schedule',
    language: 'en',
    madeAt: new Date(draftAt ?? snapshot.frozenAt ?? 0),
  });
  const flow = openFlow(press, () => {
    if (titles.draft) drawDraft(press.document);
  });
  const sheet: Sheet = {
    flow,
    snapshot,
    locale,
    clarifications: clarificationsOf(snapshot),
    quantities: printedQuantities(snapshot.takeoff),
  };
  for (const print of parts) print(sheet);
  flow.root.end();
  printFrames({ press, snapshot, titles });
  return bytesOf(press.document);
}
