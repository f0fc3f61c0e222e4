import { useLocalSearchParams } from 'expo-router';

import { JobOverview } from '@/components/job/job-overview';
import { useNextStep } from '@/components/job/use-next-step';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useJob } from '@/hooks/use-job';

export default function JobScreen() {
  const { job: jobId } = useLocalSearchParams<'/jobs/[job]'>();
  const { job, problem, reload } = useJob(jobId);
  const action = useNextStep(jobId);
  if (problem && !job) return <ProblemScreen problem={problem} onRetry={reload} />;
  if (!job) return <LoadingScreen title="Job" />;
  const over = [job.number, job.site].filter(Boolean).join(' · ');
  return (
    <Screen title={job.name} over={over} action={action}>
      <JobOverview job={job} />
    </Screen>
  );
}
