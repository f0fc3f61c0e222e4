import { useLocalSearchParams } from 'expo-router';

import { FlagList } from '@/components/flag/flag-list';
import { flaggedRows, flagsLead } from '@/components/flag/flagged-rows';
import { useRunRows } from '@/components/run/use-run-rows';
import { EmptyState } from '@/components/ui/empty-state';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useUnits } from '@/hooks/use-units';

export default function FlagsScreen() {
  const { job } = useLocalSearchParams<{ job: string }>();
  const { units } = useUnits();
  const { rows, problem, reload } = useRunRows(job);
  if (problem && !rows) return <ProblemScreen problem={problem} onRetry={reload} />;
  if (!rows) return <LoadingScreen title="Flags" />;
  const flagged = flaggedRows(rows);
  return (
    <Screen title="Flags" lead={flagsLead(flagged, rows.length)}>
      {flagged.length > 0 ? (
        <FlagList flagged={flagged} units={units} />
      ) : (
        <EmptyState
          title="No flags"
          action={{ label: 'To the schedule', href: { pathname: '/jobs/[job]/schedule', params: { job } } }}
        >
          {rows.length > 0 ? 'Every run meets the limits that were entered for it.' : 'There are no runs to judge yet.'}
        </EmptyState>
      )}
    </Screen>
  );
}
