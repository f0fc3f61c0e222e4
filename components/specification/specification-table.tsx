import type { SpecificationRow } from '@/api/contracts/build-up';
import { CoveringGlyph } from '@/components/build-up/covering-glyph';
import { coveringColumns } from '@/components/build-up/build-up-table';
import { nameIn, type CoveringNames } from '@/components/build-up/covering-words';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Text } from '@/components/ui/text';

import { byLabel } from './row-labels';

type SpecificationTableProps = { jobId: string; rows: readonly SpecificationRow[]; names: CoveringNames };

/** The table as it was handed down, in the order of its own numbers. */
export function SpecificationTable({ jobId, rows, names }: SpecificationTableProps) {
  return (
    <DataTable
      label="Specification"
      columns={columnsFor(names)}
      rows={[...rows].sort(byLabel)}
      keyOf={({ id }) => id}
      hrefOf={({ id }) => `/jobs/${jobId}/specification/${id}`}
    />
  );
}

const columnsFor = (names: CoveringNames): Column<SpecificationRow>[] => [
  {
    key: 'section',
    label: 'Section',
    hideLabel: true,
    width: 44,
    cell: (row) => <CoveringGlyph row={row} names={names} />,
  },
  { key: 'label', label: 'Row', cell: ({ label }) => label },
  {
    key: 'service',
    label: 'Service',
    cell: ({ serviceId }) => <Text weight="strong">{nameIn(names.services, serviceId)}</Text>,
  },
  ...coveringColumns<SpecificationRow>(names),
];
