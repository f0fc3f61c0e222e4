import { buildUpSchema, type BuildUp, type BuildUpInput } from '@/api/contracts/build-up';
import { useRowActions, useRows } from '@/hooks/use-job-rows';

const rowsOf = (jobId: string) => ({ path: `/jobs/${jobId}/build-ups`, schema: buildUpSchema });

export function useBuildUps(jobId: string) {
  const { rows, ...rest } = useRows(rowsOf(jobId));
  return { buildUps: rows, ...rest };
}

export const useBuildUpActions = (jobId: string) =>
  useRowActions<BuildUpInput, BuildUp>(rowsOf(jobId), `/jobs/${jobId}`);
