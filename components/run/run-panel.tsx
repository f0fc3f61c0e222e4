import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { hairline, space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Heading } from '@/components/ui/heading';

import { RunEditor } from './run-editor';
import type { RunLookups, RunRow } from './run-row';

type RunPanelProps = {
  jobId: string;
  editId: string | undefined;
  rows: readonly RunRow[];
  lookups: RunLookups;
  onClose: () => void;
  children: ReactNode;
};

/** The list, and beside it the run that is edited; where there is no room for both, the form lies over the list. */
export function RunPanel({ jobId, editId, rows, lookups, onClose, children }: RunPanelProps) {
  const theme = useTheme();
  const { isSplit } = useLayout();
  const row = rows.find(({ run }) => run.id === editId);
  return (
    <View style={styles.both}>
      <View style={styles.list}>{children}</View>
      {row ? (
        <View
          role="complementary"
          aria-label={`Run ${row.run.number}`}
          style={[styles.panel, !isSplit && styles.over, { borderLeftColor: theme.rule, backgroundColor: theme.paper }]}
        >
          <Heading>{`Run ${row.run.number}`}</Heading>
          <RunEditor
            jobId={jobId}
            row={row}
            rows={rows}
            lookups={lookups}
            onClose={onClose}
            onSaved={() => undefined}
          />
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  both: { flexDirection: 'row', flex: 1, minHeight: 0, minWidth: 0 },
  list: { flex: 1, minWidth: 0, minHeight: 0, gap: space.xs },
  panel: webStyle({
    width: 420,
    flexShrink: 0,
    overflowY: 'auto',
    paddingLeft: space.md,
    paddingRight: space.xs,
    marginLeft: space.md,
    gap: space.xs,
    borderLeftWidth: hairline,
    borderLeftStyle: 'solid',
  }),
  over: webStyle({ position: 'absolute', top: 0, right: 0, bottom: 0, width: 'min(420px, 100%)' }),
});
