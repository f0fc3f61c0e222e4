import type { BuildUp, SpecificationRow } from '@/api/contracts/build-up';
import type { Run } from '@/api/contracts/run';
import type { Service } from '@/api/contracts/service';

import { plural } from './due-words';

/** What of a job may stand on another row; what is not read yet is left out. */
export type UsingRows = {
  runs?: Run[];
  buildUps?: BuildUp[];
  specification?: SpecificationRow[];
  services?: Service[];
};
export type Used = { by: 'placeId' | 'serviceId' | 'levelId' | 'drawingId'; id: string };

/** What stands on a row, so that it cannot be taken away: one line for each kind. */
export function usesOf(rows: UsingRows, { by, id }: Used): string[] {
  const runs = (rows.runs ?? []).filter((run) => run[by] === id).map(({ number }) => number);
  const labels = (rows.specification ?? []).filter((row) => isScope(row, { by, id })).map(({ label }) => label);
  const buildUps = (rows.buildUps ?? []).filter((row) => isScope(row, { by, id }));
  const limits = by === 'placeId' ? limitedBy(rows.services ?? [], id) : [];
  return [
    ...listed(runs, 'run'),
    ...listed(labels, 'specification row'),
    ...(buildUps.length > 0 ? [plural(buildUps.length, 'build-up')] : []),
    ...listed(limits, 'service with a limit for it', 'services with a limit for it'),
  ];
}

const isScope = (row: BuildUp, { by, id }: Used): boolean =>
  (by === 'placeId' && row.placeIds.includes(id)) || (by === 'serviceId' && row.serviceId === id);

const limitedBy = (services: readonly Service[], placeId: string) =>
  services.filter(({ limits }) => limits.some((limit) => limit.placeId === placeId)).map(({ name }) => name);

const shown = 8;

/** "3 runs: R01, R02, R03"; a long list is cut, its count is not. */
function listed(names: readonly string[], one: string, many?: string): string[] {
  if (names.length === 0) return [];
  const more = names.length > shown ? ' and more' : '';
  return [`${plural(names.length, one, many)}: ${names.slice(0, shown).join(', ')}${more}`];
}
