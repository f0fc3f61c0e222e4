import { useLocalSearchParams } from 'expo-router';

import { useRunRows } from '@/components/run/use-run-rows';
import { neighboursOf } from '@/components/study/neighbours';
import { NoStudyScreen } from '@/components/study/no-study-screen';
import { RunsBeside } from '@/components/study/runs-beside';
import { StudyScreen } from '@/components/study/study-screen';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { useStudy } from '@/hooks/use-study';

export default function RunStudyScreen() {
  const { job, run } = useLocalSearchParams<{ job: string; run: string }>();
  const { rows, problem, reload } = useRunRows(job);
  const back = { href: { pathname: '/jobs/[job]/runs', params: { job } }, label: 'Runs' } as const;
  if (problem && !rows) return <ProblemScreen problem={problem} onRetry={reload} back={back} />;
  if (!rows) return <LoadingScreen title="Run" back={back} shape="study" />;
  const row = rows.find((one) => one.run.id === run);
  if (!row)
    return <ProblemScreen problem={{ title: 'This run does not exist', status: 404, detail: gone }} back={back} />;
  return (
    <RunsBeside rows={rows} chosen={run}>
      <Study key={run} jobId={job} row={row} neighbours={neighboursOf(rows, run)} />
    </RunsBeside>
  );
}

const gone = 'It may have been removed. Revisions that were frozen keep it.';

type StudyProps = { jobId: string } & Pick<Parameters<typeof StudyScreen>[0], 'row' | 'neighbours'>;

function Study({ jobId, row, neighbours }: StudyProps) {
  const { study, problem, reload } = useStudy(jobId, row.run.id);
  if (problem) return <NoStudyScreen {...{ jobId, row, problem, neighbours }} onRetry={() => void reload()} />;
  if (!study) return <LoadingScreen title={row.run.number} shape="study" />;
  return <StudyScreen {...{ jobId, row, neighbours }} runStudy={study} />;
}
