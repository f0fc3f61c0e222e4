import type { Place } from '@/api/contracts/place';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Mark } from '@/components/ui/mark';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { airText, reachWords, type SetName } from './place-words';

type PlaceTableProps = { jobId: string; places: readonly Place[] };
type Reader = ReturnType<typeof useUnits>;

/** All places against each other: a slip of 10 K shows here sooner than in a form. */
export function PlaceTable({ jobId, places }: PlaceTableProps) {
  return (
    <DataTable
      label="Places"
      columns={columnsFor(useUnits())}
      rows={places}
      keyOf={({ id }) => id}
      hrefOf={({ id }) => `/jobs/${jobId}/places/${id}`}
    />
  );
}

function columnsFor({ units, show, unitLabel }: Reader): readonly Column<Place>[] {
  const air = (name: SetName, label: string): Column<Place> => ({
    key: name,
    label,
    cell: ({ conditions }) => (
      <Text numeric noWrap>
        {airText(conditions[name], units)}
      </Text>
    ),
  });
  return [
    { key: 'name', label: 'Place', cell: ({ name }) => name },
    { key: 'where', label: 'Where', cell: (place) => <Text noWrap>{differenceText(place)}</Text> },
    { key: 'reach', label: 'Within reach of', cell: ({ reach }) => <Text noWrap>{reachWords[reach]}</Text> },
    {
      key: 'touch',
      label: 'Touch limit',
      unit: unitLabel('temperature'),
      numeric: true,
      cell: ({ reach, touchLimit }) => (
        <Limit isOpen={reach !== 'nobody'} text={touchLimit ? show('temperature', touchLimit.value, 0) : ''} />
      ),
    },
    air('hottest', 'Hottest air'),
    air('mostHumid', 'Most humid'),
    air('coldest', 'Coldest'),
    air('warmest', 'Warmest'),
    air('mean', 'Mean'),
  ];
}

/** Only what sets a place apart: most are indoors. */
const differenceText = ({ outdoor, plenum }: Place): string =>
  [...(outdoor ? ['outdoors'] : []), ...(plenum ? ['air plenum'] : [])].join(', ');

function Limit({ isOpen, text }: { isOpen: boolean; text: string }) {
  if (text)
    return (
      <Text numeric align="right">
        {text}
      </Text>
    );
  return isOpen ? (
    <Mark verdict="caution" words="none" align="right" />
  ) : (
    <Text tone="inkSoft" align="right">
      –
    </Text>
  );
}
