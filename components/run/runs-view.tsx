import { useState } from 'react';
import { View } from 'react-native';

import type { UnitSystem } from '@/api/contracts/quantities';
import { EmptyState } from '@/components/ui/empty-state';
import { Text } from '@/components/ui/text';

import { RunCard } from './run-card';
import { RunsGrid } from './runs-grid';
import type { RunRow } from './run-row';
import { totalText } from './runs-total';
import { useRunsTable } from './use-runs-table';

type RunsViewProps = {
  rows: RunRow[];
  units: UnitSystem;
  chosenId: string | undefined;
  onOpen: (row: RunRow) => void;
  asCards: boolean;
  /** the form stands beside it */
  compact: boolean;
  /** fewer than the job has: what they add up to is said */
  narrowed: boolean;
};

/** The narrowed list: a grid where there is room, else cards; below it what the list adds up to. */
export function RunsView({ rows, units, asCards, narrowed, ...grid }: RunsViewProps) {
  const [sorting, setSorting] = useState<{ id: string; desc: boolean }[]>([]);
  const { sorted, directionOf, toggle } = useRunsTable({ rows, sorting, onSort: setSorting });
  if (rows.length === 0)
    return <EmptyState title="No run fits">Nothing of this job has all that the lists above ask for.</EmptyState>;
  const total = narrowed ? (
    <Text size="small" tone="inkSoft" numeric>
      {totalText(rows, units)}
    </Text>
  ) : null;
  if (!asCards)
    return (
      <>
        <RunsGrid rows={sorted} units={units} sort={{ directionOf, toggle }} {...grid} />
        {total}
      </>
    );
  return (
    <>
      {total}
      <View role="list" aria-label="Runs">
        {sorted.map((row) => (
          <View role="listitem" key={row.run.id}>
            <RunCard row={row} units={units} />
          </View>
        ))}
      </View>
    </>
  );
}
