import type { LibrarySafety } from '@/api/contracts/library';
import { show, unitLabel } from '@/api/contracts/quantities';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Heading } from '@/components/ui/heading';
import { Notice } from '@/components/ui/notice';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { confidenceText } from './library-words';

type Start = LibrarySafety['touchDefaults'][number];
type Threshold = LibrarySafety['touchThresholds'][number];
type Units = ReturnType<typeof useUnits>['units'];

/** Where a touch limit may begin; the project decides. */
export function TouchDetail({ safety }: { safety: LibrarySafety }) {
  const { units } = useUnits();
  return (
    <Stack gap="lg">
      <Notice title="Starting values, not permission">
        The local code, the authority having jurisdiction and the project decide how hot a surface may get within reach.
        Let hot surfaces cool, or isolate them, before touching.
      </Notice>
      <Stack gap="sm">
        <Heading>Touch limits to begin with</Heading>
        <DataTable
          label="Touch limits to begin with"
          columns={startColumns(units)}
          rows={safety.touchDefaults}
          keyOf={({ id }) => id}
        />
      </Stack>
      <Stack gap="sm">
        <Heading>Burn thresholds behind them</Heading>
        <DataTable
          label="Burn thresholds"
          columns={thresholdColumns(units)}
          rows={safety.touchThresholds}
          keyOf={({ surface, contact }) => `${surface} ${contact}`}
        />
      </Stack>
      <Stack gap="xs" role="list">
        {safety.notes.map((note) => (
          <Text key={note} role="listitem" tone="inkSoft">
            {note}
          </Text>
        ))}
      </Stack>
    </Stack>
  );
}

const degrees = <Row extends { limit: number }>(label: string, units: Units): Column<Row> => ({
  key: 'limit',
  label,
  unit: unitLabel('temperature', units),
  numeric: true,
  cell: ({ limit }) => show('temperature', limit, { units, digits: 0 }),
});

const origin = <Row extends { source: string; confidence: string }>(): Column<Row> => ({
  key: 'source',
  label: 'Source, and how sure',
  cell: ({ source, confidence }) => (
    <Text size="small" tone="inkSoft">
      {`${source}. ${confidenceText(confidence)}.`}
    </Text>
  ),
});

const startColumns = (units: Units): readonly Column<Start>[] => [
  { key: 'where', label: 'Where', cell: ({ where }) => <Text>{where}</Text> },
  degrees<Start>('Limit', units),
  { key: 'basis', label: 'Basis', cell: ({ basis }) => <Text>{basis}</Text> },
  origin<Start>(),
];

const thresholdColumns = (units: Units): readonly Column<Threshold>[] => [
  { key: 'surface', label: 'Surface', cell: ({ surface }) => <Text>{surface}</Text> },
  { key: 'contact', label: 'Contact', cell: ({ contact }) => <Text noWrap>{contact}</Text> },
  degrees<Threshold>('Threshold', units),
  origin<Threshold>(),
];
