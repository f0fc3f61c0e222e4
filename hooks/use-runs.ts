import useSWR, { useSWRConfig } from 'swr';
import { z } from 'zod';

import { runSchema, runsPatchedSchema, type Run, type RunInput, type RunsPatch } from '@/api/contracts/run';
import { request, RequestFailed } from '@/hooks/request';

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

type Seen = Pick<Run, 'id' | 'version'>;

/** A batch answers with all the runs that were changed meanwhile; who writes one run hears of that one. */
function ofOne(error: unknown): never {
  if (!(error instanceof RequestFailed) || !Array.isArray(error.problem.current)) throw error;
  throw new RequestFailed({ ...error.problem, current: error.problem.current[0] });
}

/** One run at a time; the id of a new one is made here, so that a retry of the same save writes it once. */
export function useRunActions(jobId: string) {
  const patch = usePatchRuns(jobId);
  const only = async (sent: Promise<Run[]>): Promise<Run> => {
    const [run] = await sent.catch(ofOne);
    if (!run) throw new Error('The server answered without the run');
    return run;
  };
  return {
    create: (input: RunInput, id: string) => only(patch({ put: [{ ...input, id, version: null }], drop: [] })),
    change: ({ id, version }: Seen, input: RunInput) => only(patch({ put: [{ ...input, id, version }], drop: [] })),
    remove: ({ id, version }: Seen) => patch({ put: [], drop: [{ id, version }] }),
  };
}
