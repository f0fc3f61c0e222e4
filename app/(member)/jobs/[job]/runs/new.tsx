import { useLocalSearchParams, useRouter } from 'expo-router';

import { RunEditor } from '@/components/run/run-editor';
import { useRunRows } from '@/components/run/use-run-rows';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';

export default function NewRunScreen() {
  const { job } = useLocalSearchParams<{ job: string }>();
  const router = useRouter();
  const { rows, lookups, problem, reload } = useRunRows(job);
  const back = { href: { pathname: '/jobs/[job]/runs', params: { job } }, label: 'Runs' } as const;
  if (problem && !rows) return <ProblemScreen problem={problem} onRetry={reload} back={back} />;
  if (!rows || !lookups) return <LoadingScreen title="New run" />;
  return (
    <Screen title="New run" back={back} narrow>
      <RunEditor
        jobId={job}
        row={undefined}
        rows={rows}
        lookups={lookups}
        onClose={() => router.replace(back.href)}
        onSaved={(run) => router.replace({ pathname: '/jobs/[job]/runs/[run]', params: { job, run: run.id } })}
      />
    </Screen>
  );
}
