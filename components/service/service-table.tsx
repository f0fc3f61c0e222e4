import type { Service } from '@/api/contracts/service';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { usePlaces } from '@/hooks/use-places';
import { useUnits } from '@/hooks/use-units';

import { limitsText, natureText } from './service-words';

type ServiceTableProps = { jobId: string; services: readonly Service[] };
type State = Service['states'][number];

/** All services in the order of the schedule. */
export function ServiceTable({ jobId, services }: ServiceTableProps) {
  const { places = [] } = usePlaces(jobId);
  const reader = useUnits();
  return (
    <DataTable
      label="Services"
      columns={columnsFor(reader, places)}
      rows={services}
      keyOf={({ id }) => id}
      hrefOf={({ id }) => `/jobs/${jobId}/services/${id}`}
    />
  );
}

function columnsFor(
  { units, show, unitLabel }: ReturnType<typeof useUnits>,
  places: readonly { id: string; name: string }[],
): readonly Column<Service>[] {
  const degrees = (key: 'operating' | 'lowest' | 'highest', label: string): Column<Service> => ({
    key,
    label,
    unit: unitLabel('temperature'),
    numeric: true,
    cell: ({ states }) => <Stated states={states} text={(state) => show('temperature', state[key].value, 0)} />,
  });
  return [
    { key: 'name', label: 'Service', cell: ({ name }) => name },
    { key: 'fluid', label: 'Fluid', cell: ({ fluid, states }) => <Text>{`${fluid}, ${natureText(states)}`}</Text> },
    degrees('operating', 'Operating'),
    degrees('lowest', 'Lowest'),
    degrees('highest', 'Highest'),
    {
      key: 'hours',
      label: 'Hours a year',
      unit: unitLabel('hours'),
      numeric: true,
      cell: ({ hours }) => show('hours', hours.value),
    },
    {
      key: 'limits',
      label: 'Limits',
      cell: (service) => <Text tone="inkSoft">{limitsText(service, places, units)}</Text>,
    },
  ];
}

/** One figure for each state of the service, one under the other. */
const Stated = ({ states, text }: { states: readonly State[]; text: (state: State) => string }) => (
  <Stack gap="xxs">
    {states.map((state) => (
      <Text key={state.nature} numeric align="right" tone={states.length > 1 ? state.nature : undefined}>
        {text(state)}
      </Text>
    ))}
  </Stack>
);
