import type { LibraryCode } from '@/api/contracts/library';
import { show, unitLabel } from '@/api/contracts/quantities';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Heading } from '@/components/ui/heading';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { SourceLine } from './source-line';

type Ducts = NonNullable<LibraryCode['ducts']>;
type Zone = Ducts['uses'][number]['zones'][number];
type Units = ReturnType<typeof useUnits>['units'];

const useWords: Record<Ducts['uses'][number]['use'], string> = {
  both: 'Supply ducts, heating and cooling',
  heating: 'Supply ducts, heating only',
  cooling: 'Supply ducts, cooling only',
  return: 'Return ducts',
};

/** Least resistance of a duct's insulation as put up, by climate zone and where the duct lies. */
export function DuctTables({ ducts }: { ducts: Ducts }) {
  const { units } = useUnits();
  return (
    <Stack gap="sm">
      <Heading>{`Ducts: ${ducts.name}`}</Heading>
      <Text tone="inkSoft">{`Least resistance of the insulation as put up, in ${unitLabel('resistance', units)}.`}</Text>
      {ducts.uses.map(({ use, zones }) => (
        <Stack key={use} gap="xs">
          <Heading level={3}>{useWords[use]}</Heading>
          <DataTable
            label={useWords[use]}
            columns={columnsFor(ducts, units)}
            rows={zones}
            keyOf={({ zone }) => String(zone)}
          />
        </Stack>
      ))}
      <SourceLine source={ducts.source} confidence={ducts.confidence} />
    </Stack>
  );
}

const columnsFor = ({ locations }: Ducts, units: Units): readonly Column<Zone>[] => [
  { key: 'zone', label: 'Zone', cell: ({ zone }) => String(zone) },
  ...locations.map(({ id, words }, index): Column<Zone> => ({
    key: id,
    label: words,
    numeric: true,
    cell: ({ resistances }) => {
      const resistance = resistances[index];
      return resistance ? show('resistance', resistance, { units }) : 'none';
    },
  })),
];
