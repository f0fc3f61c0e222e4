import { bodyKinds } from '@/api/contracts/build-up';
import type { JobData } from '@/api/contracts/job-data';
import { nominalThickness, type ThicknessName } from '@/api/engine/standards/thickness-name';

import { bodyKindOf, toAssembly } from './assembly';
import type { Judged } from './judged';
import { extentOf } from './sizes';

/** What is put round a run, in words that a line of a document groups by. */
export type Insulation = { material: string; names: ThicknessName[]; finish: string };

export function insulationOf({ assembled, used, problem }: Judged): Insulation {
  if (!assembled) return { material: 'Not specified', names: [], finish: '' };
  if (problem !== null) return { material: 'Not calculated', names: [], finish: '' };
  const { layers, finishName } = toAssembly(assembled, used?.names ?? []);
  const materials = [...new Set(layers.map(({ materialName }) => materialName))];
  const names = layers.flatMap(({ thickness }) => thickness ?? []);
  return { material: materials.join(' + '), names, finish: finishName };
}

/** As documents list them: the services' order; pipes, ducts, equipment; by size, then by thickness. */
export function inServiceOrder(data: JobData, judged: readonly Judged[]): Judged[] {
  const services = new Map(data.services.map(({ id }, position) => [id, position]));
  const ranks = (item: Judged) => [
    services.get(item.run.serviceId) ?? 0,
    bodyKinds.indexOf(bodyKindOf(item.run)),
    extentOf(item.run.shape),
    (item.used?.names ?? []).reduce((total, name) => total + nominalThickness(name), 0),
  ];
  const ranked = judged.map((item) => ({ item, ranks: ranks(item) }));
  return ranked.toSorted((one, other) => compare(one.ranks, other.ranks)).map(({ item }) => item);
}

function compare(one: readonly number[], other: readonly number[]): number {
  const place = one.findIndex((rank, index) => rank !== other[index]);
  return place < 0 ? 0 : one[place]! - other[place]!;
}

/** Groups in the order in which their first item comes. */
export function groupBy<Item>(items: readonly Item[], keyOf: (item: Item) => string): Map<string, Item[]> {
  const groups = new Map<string, Item[]>();
  for (const item of items) {
    const key = keyOf(item);
    const group = groups.get(key);
    if (group) group.push(item);
    else groups.set(key, [item]);
  }
  return groups;
}
