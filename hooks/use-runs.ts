import useSWR, { useSWRConfig } from 'swr';
import { z } from 'zod';

import { runSchema, runsPatchedSchema, type Run, type RunsPatch } from '@/api/contracts/run';
import { request, type RequestFailed } from '@/hooks/request';

const runsSchema = z.object({ runs: runSchema.array() });
type Runs = z.infer<typeof runsSchema>;

export function useRuns(jobId: string) {
  const { data, error, mutate } = useSWR<Runs, RequestFailed>(`/jobs/${jobId}/runs`, (path: string) =>
    request(path, runsSchema),
  );
  return { runs: data?.runs, problem: error?.problem, reload: () => void mutate() };
}

/** Returns a function that writes runs; whatever follows from them (judgement, schedule, takeoff, studies) reads itself again. */
export function usePatchRuns(jobId: string) {
  const { mutate } = useSWRConfig();
  return async (patch: RunsPatch): Promise<Run[]> => {
    const path = `/jobs/${jobId}/runs`;
    const { put } = await request(path, runsPatchedSchema, { method: 'PATCH', body: patch });
    await mutate((key) => typeof key === 'string' && key.startsWith(`/jobs/${jobId}`));
    return put;
  };
}
