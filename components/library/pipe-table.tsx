import type { LibraryPipeSize } from '@/api/contracts/library';
import { show } from '@/api/contracts/quantities';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Stack } from '@/components/ui/stack';
import { useUnits } from '@/hooks/use-units';

import { SourceLine } from './source-line';

type Units = ReturnType<typeof useUnits>['units'];

/** The sizes of one standard: a nominal size is a name, its outside diameter another number. */
export function PipeTable({ sizes }: { sizes: readonly LibraryPipeSize[] }) {
  const { units, unitLabel } = useUnits();
  const origins = [...new Map(sizes.map((size) => [`${size.source} ${size.confidence}`, size])).values()];
  return (
    <Stack gap="sm">
      <DataTable
        label="Sizes"
        columns={columnsFor(sizes, units, unitLabel('dimension'))}
        rows={sizes}
        keyOf={({ nominal }) => nominal}
      />
      {origins.map(({ source, confidence }) => (
        <SourceLine key={source + confidence} source={source} confidence={confidence} />
      ))}
    </Stack>
  );
}

function columnsFor(sizes: readonly LibraryPipeSize[], units: Units, unit: string): readonly Column<LibraryPipeSize>[] {
  const length = (metres: number) => show('dimension', metres, { units, digits: units === 'SI' ? 2 : 3 });
  const walls = [...new Set(sizes.flatMap((size) => size.walls.map(({ name }) => name)))];
  return [
    { key: 'nominal', label: 'Size', cell: ({ nominal }) => nominal },
    { key: 'dn', label: 'DN', numeric: true, cell: ({ dn }) => dn ?? '–' },
    {
      key: 'outside',
      label: 'Outside',
      unit,
      numeric: true,
      cell: ({ outsideDiameter }) => show('dimension', outsideDiameter, { units, digits: units === 'SI' ? 1 : 3 }),
    },
    ...walls.map((name): Column<LibraryPipeSize> => ({
      key: name,
      label: `Wall, ${name}`,
      unit,
      numeric: true,
      cell: (size) => {
        const wall = size.walls.find((one) => one.name === name);
        return wall ? length(wall.thickness) : '–';
      },
    })),
  ];
}
