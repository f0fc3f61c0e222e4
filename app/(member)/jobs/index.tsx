import { JobList } from '@/components/job/job-list';
import { inOrderOfDue } from '@/components/job/job-order';
import { jobsLead } from '@/components/job/jobs-lead';
import { EmptyState } from '@/components/ui/empty-state';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useJobs } from '@/hooks/use-jobs';
import { useNow } from '@/hooks/use-now';
import { useMay } from '@/hooks/use-session';

const newJob = { label: 'New job', href: '/jobs/new' } as const;

export default function JobsScreen() {
  const { jobs, problem, reload } = useJobs();
  const mayEdit = useMay('edit-jobs');
  const now = useNow();
  if (problem && !jobs) return <ProblemScreen problem={problem} onRetry={reload} />;
  if (!jobs) return <LoadingScreen title="Jobs" shape="table" />;
  if (jobs.length === 0) return <NoJobs mayEdit={mayEdit} />;
  const ordered = inOrderOfDue(jobs, now);
  return (
    <Screen title="Jobs" lead={jobsLead(ordered, now)} action={mayEdit ? newJob : undefined}>
      <JobList jobs={ordered} />
    </Screen>
  );
}

function NoJobs({ mayEdit }: { mayEdit: boolean }) {
  return (
    <Screen title="Jobs">
      <EmptyState title="No job yet" action={mayEdit ? newJob : undefined}>
        {mayEdit
          ? 'Begin with its number, its name and when the bid is due. Places, services and runs follow.'
          : 'An estimator of your firm opens jobs. They stand here as soon as there are any.'}
      </EmptyState>
    </Screen>
  );
}
