import type { JobData } from '@/api/contracts/job-data';
import type { Takeoff, TakeoffLine } from '@/api/contracts/schedule';
import { sumOfNet } from '@/api/engine/takeoff/net-quantities';

import { bodyKindOf } from './assembly';
import type { Judged } from './judged';
import { groupBy, inServiceOrder, insulationOf } from './insulated-alike';
import { addFittings, quantitiesOf } from './quantities-of-run';
import { sizeWords } from './sizes';

/**
 * Net quantities as measured, by service, size and thickness. What others insulate is not ours to count and is only
 * named; what is on hold is counted and named.
 */
export function takeoffOf(data: JobData, judged: readonly Judged[]): Takeoff {
  const numbers = (status: string) => judged.flatMap(({ run }) => (run.status === status ? [run.number] : []));
  const ours = inServiceOrder(data, judged).filter(({ run }) => run.status !== 'by-others');
  return {
    lines: [...groupBy(ours, lineKey)].map(([key, group]) => takeoffLine(data, key, group)),
    fittings: addFittings(ours.map(({ run }) => run.fittings)),
    byOthers: numbers('by-others'),
    onHold: numbers('on-hold'),
  };
}

const lineKey = (judged: Judged): string =>
  JSON.stringify([judged.run.serviceId, bodyKindOf(judged.run), sizeWords(judged.run), insulationOf(judged)]);

function takeoffLine(data: JobData, key: string, group: readonly Judged[]): TakeoffLine {
  const { run } = group[0]!;
  const { material, names, finish } = insulationOf(group[0]!);
  const quantities = group.map(({ run: { shape }, used }) => quantitiesOf(shape, used));
  return {
    key,
    appliesTo: bodyKindOf(run),
    service: data.services.find(({ id }) => id === run.serviceId)?.name ?? '',
    size: sizeWords(run),
    material,
    names,
    finish,
    ...sumOfNet(quantities),
    fittings: addFittings(group.map((judged) => judged.run.fittings)),
    runIds: group.map((judged) => judged.run.id),
    runNumbers: group.map((judged) => judged.run.number),
  };
}
