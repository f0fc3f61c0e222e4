import {
  createColumnHelper,
  createSortedRowModel,
  rowSortingFeature,
  tableFeatures,
  useTable,
  type SortingState,
} from '@tanstack/react-table';

import { columnFields } from './run-fields';
import { runOrder, type RunRow } from './run-row';

type Sortable = { getValue: (key: string) => unknown };

const features = tableFeatures({
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
});
const helper = createColumnHelper<typeof features, RunRow>();

/** Numbers by size, words by the alphabet with their figures in order; read from the one description. */
const columns = helper.columns(
  columnFields.map(({ key, label, column }) =>
    helper.accessor((row) => column.sort(row), {
      id: key,
      header: label,
      sortFn: (one: Sortable, other: Sortable) => order(one.getValue(key), other.getValue(key)),
    }),
  ),
);

function order(one: unknown, other: unknown): number {
  if (typeof one === 'number' && typeof other === 'number') return one - other;
  return runOrder(String(one), String(other));
}

type TableOptions = { rows: RunRow[]; sorting: SortingState; onSort: (sorting: SortingState) => void };

/** The rows in the order asked for, and how each column is sorted. */
export function useRunsTable({ rows, sorting, onSort }: TableOptions) {
  // The compiler would keep what the table changes in place.
  'use no memo';
  const table = useTable({
    features,
    columns,
    data: rows,
    state: { sorting },
    onSortingChange: (change) => onSort(typeof change === 'function' ? change(sorting) : change),
    getRowId: ({ run }) => run.id,
    enableSortingRemoval: true,
  });
  return {
    sorted: table.getRowModel().rows.map(({ original }) => original),
    directionOf: (key: string) => table.getColumn(key)?.getIsSorted() || undefined,
    toggle: (key: string) => table.getColumn(key)?.toggleSorting(),
  };
}
