import useSWR, { useSWRConfig } from 'swr';

import { jobSchema, jobSummarySchema, type Job, type JobInput, type JobSummary } from '@/api/contracts/job';
import { request, type RequestFailed } from '@/hooks/request';

const jobsPath = '/jobs';

export function useJobs() {
  const { data, error, mutate } = useSWR<JobSummary[], RequestFailed>(jobsPath, (path: string) =>
    request(path, jobSummarySchema.array()),
  );
  return { jobs: data, problem: error?.problem, reload: () => void mutate() };
}

/** Returns a function that opens a job; the list reads itself again. */
export function useCreateJob() {
  const { mutate } = useSWRConfig();
  return async (input: JobInput): Promise<Job> => {
    const job = await request(jobsPath, jobSchema, { method: 'POST', body: input });
    void mutate(jobsPath);
    return job;
  };
}
