import { useEffect, useRef, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { RunCard } from '@/components/run/run-card';
import { totalText } from '@/components/run/runs-total';
import type { RunRow } from '@/components/run/run-row';
import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { Heading } from '@/components/ui/heading';
import { ListBeside } from '@/components/ui/list-beside';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

type RunsBesideProps = { rows: readonly RunRow[]; chosen: string; children: ReactNode };

/** The level's runs beside the one that is studied, where there is room. */
export function RunsBeside({ rows, chosen, children }: RunsBesideProps) {
  const theme = useTheme();
  const { units } = useUnits();
  const level = rows.find(({ run }) => run.id === chosen)?.level;
  const open = useRef<View>(null);
  // the list scrolls by itself: walking from run to run must not leave the open one behind
  useEffect(() => showInList(open.current), [chosen]);
  const beside = rows.filter(({ run }) => run.levelId === level?.id);
  return (
    <ListBeside
      isOpen
      list={
        <View role="navigation" aria-label="Runs">
          <View style={styles.head}>
            <Heading>{level?.name ?? 'Runs'}</Heading>
            <Text size="small" tone="inkSoft">
              {totalText(beside, units)}
            </Text>
          </View>
          <View role="list">
            {beside.map((row) => (
              <View
                key={row.run.id}
                ref={row.run.id === chosen ? open : undefined}
                role="listitem"
                style={[
                  styles.row,
                  row.run.id === chosen && { backgroundColor: theme.sheet, borderLeftColor: theme.oxide },
                ]}
              >
                <RunCard row={row} units={units} />
              </View>
            ))}
          </View>
        </View>
      }
    >
      {children}
    </ListBeside>
  );
}

function showInList(row: unknown): void {
  if (row instanceof HTMLElement && typeof row.scrollIntoView === 'function') row.scrollIntoView({ block: 'nearest' });
}

const styles = StyleSheet.create({
  head: { paddingHorizontal: space.md, paddingTop: space.lg, paddingBottom: space.sm },
  row: { paddingHorizontal: space.md, borderLeftWidth: 3, borderLeftColor: 'transparent' },
});
