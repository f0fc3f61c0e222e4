import { useLocalSearchParams, useRouter } from 'expo-router';

import { RunFilterBar } from '@/components/run/run-filter-bar';
import { filterChoices, narrow } from '@/components/run/run-filters';
import { RunPanel } from '@/components/run/run-panel';
import { RunsView } from '@/components/run/runs-view';
import { totalText } from '@/components/run/runs-total';
import { useRunFilter } from '@/components/run/use-run-filter';
import { useRunRows } from '@/components/run/use-run-rows';
import { useLayout } from '@/components/theme/use-layout';
import { EmptyState } from '@/components/ui/empty-state';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useMay } from '@/hooks/use-session';
import { useUnits } from '@/hooks/use-units';

export default function RunsScreen() {
  const { job, edit } = useLocalSearchParams<{ job: string; edit?: string }>();
  const router = useRouter();
  const { units } = useUnits();
  const { isPhone } = useLayout();
  const mayEdit = useMay('edit-jobs');
  const { rows, lookups, problem, reload } = useRunRows(job);
  const { filter, change, clear } = useRunFilter();
  if (problem && !rows) return <ProblemScreen problem={problem} onRetry={reload} />;
  if (!rows || !lookups) return <LoadingScreen title="Runs" />;
  const add = { label: 'New run', href: { pathname: '/jobs/[job]/runs/new', params: { job } } } as const;
  const beside = isPhone ? undefined : edit;
  if (rows.length === 0)
    return (
      <Screen title="Runs">
        <EmptyState title="No runs yet" action={mayEdit ? add : undefined}>
          A run is a stretch of one service and size in one place. Enter the first from a drawing; its thickness is
          judged at once.
        </EmptyState>
      </Screen>
    );
  return (
    <Screen title="Runs" lead={totalText(rows, units)} action={mayEdit ? add : undefined} fixed={!isPhone}>
      <RunFilterBar choices={filterChoices(rows, lookups)} filter={filter} onChange={change} onClear={clear} />
      <RunPanel
        jobId={job}
        editId={mayEdit ? beside : undefined}
        rows={rows}
        lookups={lookups}
        onClose={() => router.setParams({ edit: undefined })}
      >
        <RunsView
          rows={narrow(rows, filter)}
          units={units}
          chosenId={beside}
          asCards={isPhone}
          compact={beside !== undefined}
          narrowed={Object.keys(filter).length > 0}
          onOpen={({ run }) =>
            mayEdit
              ? router.setParams({ edit: run.id })
              : router.push({ pathname: '/jobs/[job]/runs/[run]', params: { job, run: run.id } })
          }
        />
      </RunPanel>
    </Screen>
  );
}
