import { runOrder, type RunLookups, type RunRow } from './run-row';

/** What the list is narrowed to; it stands in the page's address, so that a narrowed list can be sent and come back to. */
export const filterKeys = ['service', 'place', 'level', 'drawing', 'flags'] as const;
export type FilterKey = (typeof filterKeys)[number];
export type RunFilter = Partial<Record<FilterKey, string>>;

export const flagFilters = { flagged: 'Flagged', hold: 'On hold', clear: 'Meets all' } as const;

export const narrow = (rows: readonly RunRow[], filter: RunFilter): RunRow[] => rows.filter((row) => fits(row, filter));

const fits = ({ run, judged }: RunRow, filter: RunFilter): boolean =>
  isAsked(run.serviceId, filter.service) &&
  isAsked(run.placeId, filter.place) &&
  isAsked(run.levelId, filter.level) &&
  isAsked(run.drawingId, filter.drawing) &&
  fitsFlags(judged?.flags ?? [], filter.flags);

const isAsked = (id: string | null, wanted: string | undefined) => !wanted || id === wanted;

function fitsFlags(flags: readonly { kind: string }[], wanted: string | undefined): boolean {
  if (wanted === 'flagged') return flags.some(({ kind }) => kind !== 'hold');
  if (wanted === 'hold') return flags.some(({ kind }) => kind === 'hold');
  return wanted !== 'clear' || flags.length === 0;
}

export type FilterChoice = { key: FilterKey; label: string; options: { value: string; label: string }[] };

/** What can be chosen: only what some run of the job has. */
export function filterChoices(
  rows: readonly RunRow[],
  { services, places, levels, drawings }: RunLookups,
): FilterChoice[] {
  const used = (pick: (row: RunRow) => string | null) => new Set(rows.map(pick));
  const named = (items: readonly { id: string; name: string }[], ids: Set<string | null>) =>
    items.filter(({ id }) => ids.has(id)).map(({ id, name }) => ({ value: id, label: name }));
  const byNumber = drawings
    .map(({ id, number }) => ({ id, name: number }))
    .toSorted((a, b) => runOrder(a.name, b.name));
  return [
    {
      key: 'level',
      label: 'Level',
      options: named(
        levels,
        used(({ run }) => run.levelId),
      ),
    },
    {
      key: 'service',
      label: 'Service',
      options: named(
        services,
        used(({ run }) => run.serviceId),
      ),
    },
    {
      key: 'place',
      label: 'Place',
      options: named(
        places,
        used(({ run }) => run.placeId),
      ),
    },
    {
      key: 'drawing',
      label: 'Drawing',
      options: named(
        byNumber,
        used(({ run }) => run.drawingId),
      ),
    },
    { key: 'flags', label: 'Limits', options: Object.entries(flagFilters).map(([value, label]) => ({ value, label })) },
  ];
}
