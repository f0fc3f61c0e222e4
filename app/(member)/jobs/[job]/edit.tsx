import { useLocalSearchParams } from 'expo-router';

import { JobEditor } from '@/components/job/job-editor';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { Notice } from '@/components/ui/notice';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useJob } from '@/hooks/use-job';
import { useMay } from '@/hooks/use-session';

export default function EditJobScreen() {
  const { job: jobId } = useLocalSearchParams<'/jobs/[job]/edit'>();
  const { job, problem, reload } = useJob(jobId);
  const mayEdit = useMay('edit-jobs');
  const back = { href: `/jobs/${jobId}`, label: job?.name ?? 'Job' } as const;
  if (problem && !job) return <ProblemScreen problem={problem} onRetry={reload} back={back} />;
  if (!job) return <LoadingScreen title="Job" back={back} shape="form" />;
  return (
    <Screen title="The job’s details" tabTitle={`Details of ${job.number}`} back={back} narrow>
      {mayEdit ? <JobEditor job={job} /> : <Notice>An estimator of your firm changes jobs.</Notice>}
    </Screen>
  );
}
