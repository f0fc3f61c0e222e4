import { StyleSheet, View } from 'react-native';

import type { UnitSystem } from '@/api/contracts/quantities';
import type { ScheduleRow } from '@/api/contracts/schedule';
import { hairline, space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';
import { DataTable, type Column } from '@/components/ui/data-table';
import { Mark } from '@/components/ui/mark';
import { Text } from '@/components/ui/text';

import { ScheduleGlyph } from './schedule-glyph';
import { decidesText, fromText, layersText, materialText, retarderWords } from './schedule-words';

type ScheduleListProps = { rows: readonly ScheduleRow[]; units: UnitSystem };

/** The schedule as an engineer expects it: a table where there is room, else one block for each line. */
export function ScheduleList({ rows, units }: ScheduleListProps) {
  const { isPhone } = useLayout();
  if (!isPhone)
    return <DataTable label="Schedule of insulation" columns={columnsIn(units)} rows={rows} keyOf={keyOf} />;
  return (
    <View role="list" aria-label="Schedule of insulation">
      {rows.map((row) => (
        <ScheduleBlock key={row.key} row={row} units={units} />
      ))}
    </View>
  );
}

const keyOf = ({ key }: ScheduleRow) => key;

const columnsIn = (units: UnitSystem): Column<ScheduleRow>[] => [
  {
    key: 'section',
    label: 'Section',
    hideLabel: true,
    width: 64,
    cell: (row) => <ScheduleGlyph row={row} size={40} />,
  },
  {
    key: 'service',
    label: 'Service and size',
    cell: (row) => <Pair first={row.service} second={row.sizes.join(', ')} strong />,
  },
  { key: 'place', label: 'Place', cell: (row) => <Text>{row.places.join(', ')}</Text> },
  { key: 'material', label: 'Material and finish', cell: (row) => <Covering row={row} /> },
  {
    key: 'thickness',
    label: 'Thickness',
    numeric: true,
    width: 128,
    cell: (row) => (
      <Text size="lead" weight="strong" numeric align="right" noWrap>
        {layersText(row, units)}
      </Text>
    ),
  },
  { key: 'decides', label: 'From, and what decides', cell: (row) => <Decides row={row} units={units} /> },
  {
    key: 'runs',
    label: 'Runs',
    cell: (row) => (
      <Text size="small" tone="inkSoft">
        {row.runNumbers.join(', ')}
      </Text>
    ),
  },
];

const Pair = ({ first, second, strong }: { first: string; second: string; strong?: boolean }) => (
  <View>
    <Text weight={strong ? 'strong' : 'regular'}>{first}</Text>
    {second ? (
      <Text size="small" tone="inkSoft">
        {second}
      </Text>
    ) : null}
  </View>
);

function Covering({ row }: { row: ScheduleRow }) {
  const retarder = retarderWords[row.vapourRetarder];
  return <Pair first={materialText(row)} second={[row.finish, retarder].filter(Boolean).join('; ')} />;
}

function Decides({ row, units }: { row: ScheduleRow; units: UnitSystem }) {
  const words = decidesText(row, units);
  return (
    <View>
      <Text size="small">{fromText(row)}</Text>
      {row.flags > 0 ? (
        <Mark verdict="fail" words={words} />
      ) : (
        <Text size="small" tone="inkSoft">
          {words}
        </Text>
      )}
    </View>
  );
}

function ScheduleBlock({ row, units }: { row: ScheduleRow; units: UnitSystem }) {
  const theme = useTheme();
  return (
    <View role="listitem" style={[styles.block, { borderBottomColor: theme.rule }]}>
      <ScheduleGlyph row={row} size={40} />
      <View style={styles.words}>
        <View style={styles.head}>
          <View style={styles.title}>
            <Pair first={row.service} second={row.sizes.join(', ')} strong />
          </View>
          <Text size="lead" weight="strong" numeric noWrap>
            {layersText(row, units)}
          </Text>
        </View>
        <Text size="small" tone="inkSoft">
          {row.places.join(', ')}
        </Text>
        <Covering row={row} />
        <Decides row={row} units={units} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  block: { flexDirection: 'row', gap: space.sm, paddingVertical: space.md, borderBottomWidth: hairline },
  words: { flex: 1, minWidth: 0, gap: space.xxs },
  head: { flexDirection: 'row', gap: space.sm, alignItems: 'flex-start' },
  title: { flex: 1, minWidth: 0 },
});
