import type { Drawing, Level } from '@/api/contracts/basis';
import type { JudgedRun, Judgement } from '@/api/contracts/judgement';
import type { LibraryPipeSize } from '@/api/contracts/library';
import type { Place } from '@/api/contracts/place';
import type { UnitSystem } from '@/api/contracts/quantities';
import type { Run, Shape } from '@/api/contracts/run';
import { sizeText } from '@/api/contracts/run-words';
import type { Service } from '@/api/contracts/service';

/** What runs name by id. */
export type RunLookups = {
  services: readonly Service[];
  places: readonly Place[];
  levels: readonly Level[];
  drawings: readonly Drawing[];
  pipeSizes: readonly LibraryPipeSize[];
};

/** A run with all that stands beside it in a list. */
export type RunRow = {
  run: Run;
  judged: JudgedRun | undefined;
  service: Service | undefined;
  place: Place | undefined;
  level: Level | undefined;
  drawing: Drawing | undefined;
  pipeSize: LibraryPipeSize | undefined;
};

export function joinRuns(runs: readonly Run[], judgement: Judgement | undefined, lookups: RunLookups): RunRow[] {
  const judgedOf = byId(judgement?.runs ?? [], ({ runId }) => runId);
  const serviceOf = byId(lookups.services);
  const placeOf = byId(lookups.places);
  const levelOf = byId(lookups.levels);
  const drawingOf = byId(lookups.drawings);
  const sizeOf = byId(lookups.pipeSizes, ({ standard, nominal }) => `${standard} ${nominal}`);
  return runs.map((run) => ({
    run,
    judged: judgedOf.get(run.id),
    service: serviceOf.get(run.serviceId),
    place: placeOf.get(run.placeId),
    level: levelOf.get(run.levelId),
    drawing: run.drawingId ? drawingOf.get(run.drawingId) : undefined,
    pipeSize: sizeOf.get(sizeKey(run.shape)),
  }));
}

function byId<Item>(items: readonly Item[], key: (item: Item) => string): Map<string, Item>;
function byId<Item extends { id: string }>(items: readonly Item[]): Map<string, Item>;
function byId<Item extends { id?: string }>(items: readonly Item[], key = (item: Item) => item.id ?? '') {
  return new Map(items.map((item) => [key(item), item]));
}

const sizeKey = (shape: Shape) =>
  shape.kind === 'pipe' && shape.size.standard !== 'other' ? `${shape.size.standard} ${shape.size.nominal}` : '';

/** Steel by its DN in SI and by inches otherwise; tube by its own nominal; the rest by its measures. */
export function rowSize({ run, pipeSize }: Pick<RunRow, 'run' | 'pipeSize'>, units: UnitSystem): string {
  if (pipeSize?.standard !== 'asme-steel') return sizeText(run.shape, units);
  if (units === 'SI' && pipeSize.dn !== null) return `DN ${pipeSize.dn}`;
  return pipeSize.nominal.replace(/^NPS (.*)$/, '$1 in');
}

/** What sizes are sorted by [m]: the bare diameter, or the width. */
export function bareSize({ run, pipeSize }: RunRow): number {
  const { shape } = run;
  switch (shape.kind) {
    case 'pipe':
      return shape.size.standard === 'other' ? shape.size.outsideDiameter.value : (pipeSize?.outsideDiameter ?? 0);
    case 'rectangular-duct':
      return shape.width.value;
    case 'round-duct':
    case 'vessel':
      return shape.diameter.value;
    case 'flat':
      return shape.height.value;
    case 'piece':
      return 0;
  }
}

/** "R2" before "R10". */
export const runOrder = new Intl.Collator('en', { numeric: true }).compare;
