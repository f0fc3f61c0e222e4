import type { Judgement } from '@/api/contracts/judgement';
import { showWithUnit, type UnitSystem } from '@/api/contracts/quantities';
import type { Revision } from '@/api/contracts/revision';
import type { Run } from '@/api/contracts/run';
import { lengthOf } from '@/api/contracts/run-words';

import { plural } from './due-words';

/** "42 pipe runs (2,296.5 m), 6 duct runs (173.0 m) and 4 pieces of equipment". */
export function takenOffText(runs: readonly Run[], units: UnitSystem): string {
  const of = (...kinds: Run['shape']['kind'][]) => runs.filter(({ shape }) => kinds.includes(shape.kind));
  return listText([
    ...measured(of('pipe'), 'pipe run', units),
    ...measured(of('round-duct', 'rectangular-duct'), 'duct run', units),
    ...counted(of('vessel', 'flat', 'piece').length, 'piece of equipment', 'pieces of equipment'),
  ]);
}

function measured(runs: readonly Run[], one: string, units: UnitSystem): string[] {
  const length = runs.reduce((sum, { shape }) => sum + (lengthOf(shape) ?? 0), 0);
  return counted(runs.length, one).map((text) => `${text} (${grouped(showWithUnit('length', length, { units }))})`);
}

const counted = (count: number, one: string, many?: string) => (count > 0 ? [plural(count, one, many)] : []);
export const listText = (parts: readonly string[]): string =>
  parts.length < 2 ? (parts[0] ?? '') : `${parts.slice(0, -1).join(', ')} and ${parts.at(-1)}`;
const grouped = (text: string) => text.replace(/\d{4,}/, (digits) => Number(digits).toLocaleString('en-GB'));

export type Flagged = { notMet: string[]; onHold: string[]; open: string[] };

/** Run numbers by what stands against them: a limit not met, a hold, nothing that says how to insulate. */
export function flaggedRuns(runs: readonly Run[], judgement: Judgement): Flagged {
  const numbers = new Map(runs.map(({ id, number }) => [id, number]));
  const withFlag = (is: (kind: string) => boolean) =>
    judgement.runs
      .filter(({ flags }) => flags.some(({ kind }) => is(kind)))
      .flatMap(({ runId }) => numbers.get(runId) ?? []);
  const isOpen = (kind: string) => kind === 'not-specified' || kind === 'not-calculated';
  return {
    notMet: withFlag((kind) => kind !== 'hold' && !isOpen(kind)),
    onHold: withFlag((kind) => kind === 'hold'),
    open: withFlag(isOpen),
  };
}

/** The newest revision, and how far it got: "Revision B, frozen 28 November by Ada Quill; sent to two people". */
export function revisionText(revision: Revision, timeZone: string): string {
  const day = dayText(revision.frozenAt, timeZone);
  const sent = revision.messages.filter(({ state }) => state === 'sent').length;
  const went =
    sent > 0
      ? `sent to ${sent === 1 ? revision.messages.find(({ state }) => state === 'sent')!.to.name : plural(sent, 'person', 'people')}`
      : 'not sent yet';
  return `Revision ${revision.letter} was frozen on ${day} by ${revision.frozenBy}; ${went}.`;
}

export const dayText = (instant: string, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', {
    timeZone,
    day: 'numeric',
    month: 'long',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  })
    .format(new Date(instant))
    .replace(' at ', ', ');
