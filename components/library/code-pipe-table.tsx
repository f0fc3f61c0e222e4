import type { LibraryCode } from '@/api/contracts/library';
import { showWithUnit } from '@/api/contracts/quantities';
import { thicknessText } from '@/api/contracts/words-text';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { conductivityText, conductivityUnit } from './library-words';

type Pipes = LibraryCode['pipes'];
type Band = Pipes['bands'][number];
type Units = ReturnType<typeof useUnits>['units'];

/** Least thickness by fluid temperature and nominal size. */
export function PipeBandTable({ pipes }: { pipes: Pipes }) {
  const { units } = useUnits();
  return (
    <DataTable
      label={pipes.name}
      columns={columnsFor(pipes, units)}
      rows={pipes.bands}
      keyOf={({ printed }) => printed}
    />
  );
}

const columnsFor = (pipes: Pipes, units: Units): readonly Column<Band>[] => [
  { key: 'fluid', label: 'Fluid', cell: (band) => <Text noWrap>{fluidText(band, units)}</Text> },
  ...pipes.columns.map((title, index): Column<Band> => ({
    key: title,
    label: title,
    numeric: true,
    cell: ({ thicknesses }) => {
      const name = thicknesses[index];
      return name ? thicknessText([name], units) : 'none';
    },
  })),
  {
    key: 'k',
    label: 'Conductivity',
    unit: conductivityUnit(units),
    numeric: true,
    cell: ({ conductivity: [low, high] }) => `${conductivityText(low, units)} to ${conductivityText(high, units)}`,
  },
  {
    key: 'mean',
    label: 'at a mean of',
    numeric: true,
    cell: ({ ratingMean }) => whole(ratingMean, units),
  },
];

/** The band in the reader's units; the table itself is printed in °F. */
function fluidText({ from, to, printed }: Band, units: Units): string {
  if (units === 'IP') return `${printed} °F`;
  if (from === null && to === null) return printed;
  if (from === null) return `below ${whole(to!, units)}`;
  if (to === null) return `above ${whole(from, units)}`;
  return `${Math.round(from)} to ${whole(to, units)}`;
}

const whole = (celsius: number, units: Units): string => showWithUnit('temperature', celsius, { units, digits: 0 });
