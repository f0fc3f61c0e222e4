import { useLocalSearchParams, useRouter } from 'expo-router';

import { RunEditor } from '@/components/run/run-editor';
import { useRunRows } from '@/components/run/use-run-rows';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';

export default function EditRunScreen() {
  const { job, run } = useLocalSearchParams<{ job: string; run: string }>();
  const router = useRouter();
  const { rows, lookups, problem, reload } = useRunRows(job);
  const back = { href: { pathname: '/jobs/[job]/runs/[run]', params: { job, run } }, label: 'Study' } as const;
  const list = { pathname: '/jobs/[job]/runs', params: { job } } as const;
  if (problem && !rows) return <ProblemScreen problem={problem} onRetry={reload} back={back} />;
  if (!rows || !lookups) return <LoadingScreen title="Run" />;
  const row = rows.find((one) => one.run.id === run);
  if (!row)
    return (
      <ProblemScreen problem={{ title: 'This run does not exist', status: 404 }} back={{ href: list, label: 'Runs' }} />
    );
  return (
    <Screen title={`Run ${row.run.number}`} back={back} narrow>
      <RunEditor
        jobId={job}
        row={row}
        rows={rows}
        lookups={lookups}
        onClose={() => router.replace(list)}
        onSaved={() => router.replace(back.href)}
      />
    </Screen>
  );
}
