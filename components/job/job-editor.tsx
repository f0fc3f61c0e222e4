import { useRouter } from 'expo-router';

import type { Job } from '@/api/contracts/job';
import { Loading } from '@/components/ui/loading';
import { useToast } from '@/components/ui/toast';
import { useCodes } from '@/hooks/use-library';
import { useSession } from '@/hooks/use-session';

import { JobForm } from './job-form';

/** The job's own form, once what it is chosen from is read; afterwards back to the job. */
export function JobEditor({ job }: { job: Job | null }) {
  const router = useRouter();
  const toast = useToast();
  const { session } = useSession();
  const { data: codes } = useCodes();
  if (!session || !codes) return <Loading label="Job" shape="form" />;
  return (
    <JobForm
      job={job}
      firm={session.firm}
      codes={codes}
      onSaved={({ id, name }) => {
        toast({ text: `${name} is saved.` });
        router.replace(`/jobs/${id}`);
      }}
      onCancel={() => router.replace(job ? `/jobs/${job.id}` : '/jobs')}
    />
  );
}
