import { show, unitLabel, type QuantityKind, type UnitSystem } from '@/api/contracts/quantities';
import { countWords } from '@/api/contracts/run-words';
import type { Takeoff, TakeoffLine } from '@/api/contracts/schedule';
import { thicknessText } from '@/api/contracts/words-text';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Heading } from '@/components/ui/heading';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

type TakeoffTablesProps = { takeoff: Takeoff; units: UnitSystem };

const groups = [
  { appliesTo: 'pipe', title: 'Pipes and tubes' },
  { appliesTo: 'duct', title: 'Ducts' },
  { appliesTo: 'equipment', title: 'Equipment' },
] as const;

/** What was measured and counted, by service, size and thickness; waste and equivalents are no part of it. */
export function TakeoffTables({ takeoff, units }: TakeoffTablesProps) {
  return (
    <Stack gap="lg">
      {groups.map(({ appliesTo, title }) => {
        const lines = takeoff.lines.filter((line) => line.appliesTo === appliesTo);
        return lines.length > 0 ? (
          <Stack key={appliesTo} gap="xs">
            <Heading level={3}>{title}</Heading>
            <DataTable
              label={title}
              columns={columnsOf(appliesTo, units)}
              rows={lines}
              keyOf={({ key }) => key}
              footer={<Total lines={lines} units={units} />}
            />
          </Stack>
        ) : null;
      })}
      <Apart words="By others, in the lines above" numbers={takeoff.byOthers} />
      <Apart words="On hold, in the lines above" numbers={takeoff.onHold} />
    </Stack>
  );
}

const Apart = ({ words, numbers }: { words: string; numbers: readonly string[] }) =>
  numbers.length > 0 ? <Text size="small" tone="inkSoft">{`${words}: ${numbers.join(', ')}.`}</Text> : null;

const number = (kind: QuantityKind, value: number | null, units: UnitSystem) =>
  value === null ? '' : show(kind, value, { units, digits: kind === 'area' ? 2 : 1 });

function columnsOf(appliesTo: TakeoffLine['appliesTo'], units: UnitSystem): Column<TakeoffLine>[] {
  const columns: Column<TakeoffLine>[] = [
    { key: 'service', label: 'Service', cell: ({ service }) => <Text weight="strong">{service}</Text> },
    { key: 'size', label: appliesTo === 'equipment' ? 'Item' : 'Size', cell: ({ size }) => <Text>{size}</Text> },
    { key: 'material', label: 'Material and finish', cell: (line) => <Covering line={line} /> },
    {
      key: 'names',
      label: 'Thickness',
      numeric: true,
      cell: ({ names }) => (names.length ? thicknessText(names, units) : '–'),
    },
    {
      key: 'fittings',
      label: 'Fittings',
      cell: ({ fittings }) => (
        <Text size="small" tone="inkSoft">
          {fittings.map(({ kind, count }) => countWords(kind, count)).join(', ')}
        </Text>
      ),
    },
    { key: 'count', label: 'Pieces', numeric: true, cell: ({ count }) => count ?? '' },
    {
      key: 'length',
      label: 'Length',
      unit: unitLabel('length', units),
      numeric: true,
      cell: ({ length }) => number('length', length, units),
    },
    {
      key: 'area',
      label: 'Finished area',
      unit: unitLabel('area', units),
      numeric: true,
      cell: ({ area }) => number('area', area, units),
    },
  ];
  const without = { pipe: ['count'], duct: ['count'], equipment: ['fittings', 'length'] }[appliesTo];
  return columns.filter(({ key }) => !without.includes(key));
}

const Covering = ({ line }: { line: TakeoffLine }) => (
  <Text size="small" tone="inkSoft">{`${line.material}; ${line.finish}`}</Text>
);

/** The sum of the lines as they are printed, so that whoever adds them up finds the same. */
function Total({ lines, units }: { lines: readonly TakeoffLine[]; units: UnitSystem }) {
  const sum = (kind: 'length' | 'area') =>
    lines.reduce((total, line) => total + Number(number(kind, line[kind], units) || 0), 0);
  const parts = [
    ...(sum('length') > 0 ? [`${sum('length').toFixed(1)} ${unitLabel('length', units)}`] : []),
    `${sum('area').toFixed(2)} ${unitLabel('area', units)} finished`,
  ];
  return (
    <Text weight="strong" numeric align="right">
      {`Total ${parts.join(', ')}`}
    </Text>
  );
}
