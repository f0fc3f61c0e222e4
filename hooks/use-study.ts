import useSWR, { useSWRConfig } from 'swr';

import type { Override, Run } from '@/api/contracts/run';
import { runStudySchema, workingSchema, type RunStudy, type Working } from '@/api/contracts/study';
import { request, RequestFailed } from '@/hooks/request';
import { usePatchRuns } from '@/hooks/use-runs';

const studyPath = (jobId: string, runId: string) => `/jobs/${jobId}/runs/${runId}`;

/** A run's study; worked out again by the server at each request, so it is read again after every change of the job. */
export function useStudy(jobId: string, runId: string) {
  const { data, error, mutate, isValidating } = useSWR<RunStudy, RequestFailed>(
    `${studyPath(jobId, runId)}/study`,
    (path: string) => request(path, runStudySchema),
  );
  // an answer that came before the run could no longer be calculated is not its study any more
  return {
    study: error ? undefined : data,
    problem: error?.problem,
    isRefreshing: isValidating,
    reload: () => mutate(),
  };
}

export type WorkingAsked = { candidate: number; about: string };

/** The working of one number; nothing is asked for as long as nothing is opened. */
export function useWorking({ jobId, runId }: { jobId: string; runId: string }, asked: WorkingAsked | undefined) {
  const key = asked && `${studyPath(jobId, runId)}/working?candidate=${asked.candidate}&about=${asked.about}`;
  const { data, error, mutate } = useSWR<Working, RequestFailed>(key ?? null, (path: string) =>
    request(path, workingSchema),
  );
  return { working: data, problem: error?.problem, reload: () => void mutate() };
}

/** Returns a function that writes a run's departure from the specification. A stale one shows what others made of the run meanwhile. @throws RequestFailed */
export function useSaveOverride(jobId: string) {
  const patch = usePatchRuns(jobId);
  const { mutate } = useSWRConfig();
  return async (run: Run, override: Override | null): Promise<Run> => {
    try {
      const saved = await patch({ put: [{ ...run, override }], drop: [] });
      return saved[0] ?? run;
    } catch (error) {
      if (error instanceof RequestFailed && error.problem.type === '/problems/stale')
        await mutate((key) => typeof key === 'string' && key.startsWith(`/jobs/${jobId}`));
      throw error;
    }
  };
}
