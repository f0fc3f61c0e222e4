import useSWR, { useSWRConfig } from 'swr';

import { jobSchema, type Job, type JobInput } from '@/api/contracts/job';
import { request, type RequestFailed } from '@/hooks/request';

export function useJob(jobId: string) {
  const { data, error, mutate } = useSWR<Job, RequestFailed>(`/jobs/${jobId}`, (path: string) =>
    request(path, jobSchema),
  );
  return { job: data, problem: error?.problem, reload: () => void mutate() };
}

/** Returns a function that changes the job; its altitude, code edition and series decide everything else, which is read again. */
export function useChangeJob() {
  const { mutate } = useSWRConfig();
  return async (seen: Pick<Job, 'id' | 'version'>, input: JobInput): Promise<Job> => {
    const path = `/jobs/${seen.id}`;
    const job = await request(path, jobSchema, { method: 'PATCH', body: { ...input, version: seen.version } });
    await mutate(path, job, { revalidate: false });
    void mutate((key) => typeof key === 'string' && (key === '/jobs' || (key.startsWith(path) && key !== path)));
    return job;
  };
}
