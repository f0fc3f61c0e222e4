import useSWR from 'swr';

import { judgementSchema, type Judgement } from '@/api/contracts/judgement';
import { request, type RequestFailed } from '@/hooks/request';

/** Every run of a job, judged at what is put up. */
export function useJudgement(jobId: string) {
  const { data, error, mutate } = useSWR<Judgement, RequestFailed>(`/jobs/${jobId}/judgement`, (path: string) =>
    request(path, judgementSchema),
  );
  return { judgement: data, problem: error?.problem, reload: () => void mutate() };
}
