import type { JobData } from '@/api/contracts/job-data';
import type { Run } from '@/api/contracts/run';
import { lengthOf } from '@/api/contracts/run-words';
import type { DrawnSection, Schedule, ScheduleRow } from '@/api/contracts/schedule';

import { bodyKindOf, toAssembly, type Assembled } from './assembly';
import { decidesWords } from './deciding';
import { flagsOf } from './flagging';
import { groupBy, inServiceOrder } from './insulated-alike';
import type { Judged } from './judged';
import { bodyShape } from './judging';
import { sizeRanges } from './sizes';

type Specified = Judged & { assembled: Assembled };

/** The resulting specification: each service with the sizes and places that are insulated alike, and what decides. */
export function scheduleOf(data: JobData, judged: readonly Judged[]): Schedule {
  const ours = inServiceOrder(data, judged)
    .filter(isSpecified)
    .filter(({ run, problem }) => run.status !== 'by-others' && problem === null);
  const groups = [...groupBy(ours, rowKey)];
  return { rows: groups.map(([key, group]) => scheduleRow({ data, ours }, key, group)) };
}

const isSpecified = (item: Judged): item is Specified => item.assembled !== null;

const rowKey = ({ run, assembled, used }: Specified): string =>
  JSON.stringify([
    run.serviceId,
    bodyKindOf(run),
    assembled.source,
    assembled.row?.id ?? null,
    toAssembly(assembled, used?.names ?? []).layers,
    assembled.finishId,
    assembled.vapourRetarder,
  ]);

type Whole = { data: JobData; ours: readonly Specified[] };

function scheduleRow({ data, ours }: Whole, key: string, group: readonly Specified[]): ScheduleRow {
  const runs = group.map(({ run }) => run);
  const drawn = longest(group);
  const { run, assembled, used, study } = drawn;
  const put = toAssembly(assembled, used?.names ?? []);
  return {
    key,
    serviceId: run.serviceId,
    service: data.services.find(({ id }) => id === run.serviceId)?.name ?? '',
    appliesTo: bodyKindOf(run),
    operating: distinct(group.flatMap(({ input }) => input?.states.map(({ operating }) => operating) ?? [])),
    sizes: sizeRanges(runs, insulatedOtherwise(ours, group)),
    places: data.places.filter(({ id }) => runs.some(({ placeId }) => placeId === id)).map(({ name }) => name),
    layers: put.layers.map(({ materialName, thickness }) => ({ material: materialName, thickness })),
    finish: put.finishName,
    vapourRetarder: put.vapourRetarder,
    source: put.source,
    specificationLabel: put.specificationLabel,
    reasons: distinct(group.map((item) => item.assembled.reason)).filter((reason) => reason !== ''),
    governing: study?.governing ?? null,
    decides: decidesWords(group),
    runIds: runs.map(({ id }) => id),
    runNumbers: runs.map(({ number }) => number),
    flags: group.reduce((count, item) => count + flagsOf(item).length, 0),
    section: sectionOf(drawn),
  };
}

/** Runs of the same service and places in other rows: their sizes cut a range of sizes in two. */
function insulatedOtherwise(ours: readonly Specified[], group: readonly Specified[]): Run[] {
  const places = new Set(group.map(({ run }) => run.placeId));
  return ours
    .filter((item) => !group.includes(item) && places.has(item.run.placeId))
    .map(({ run }) => run)
    .filter(({ serviceId }) => serviceId === group[0]?.run.serviceId);
}

const longest = (group: readonly Specified[]): Specified =>
  group.reduce((best, item) => ((lengthOf(item.run.shape) ?? 0) > (lengthOf(best.run.shape) ?? 0) ? item : best));

const distinct = <Value>(values: readonly Value[]): Value[] => [...new Set(values)];

function sectionOf({ assembled, input, used }: Specified): DrawnSection | null {
  if (!input || !used) return null;
  return {
    ...bodyShape(input.body),
    layers: assembled.layers.map(({ materialId }, index) => ({
      materialId,
      thickness: used.layerThicknesses[index] ?? 0,
    })),
    nature: input.states[0]?.nature ?? 'hot',
  };
}
