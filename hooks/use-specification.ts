import { specificationRowSchema, type SpecificationRow, type SpecificationRowInput } from '@/api/contracts/build-up';
import { useRowActions, useRows } from '@/hooks/use-job-rows';

const rowsOf = (jobId: string) => ({ path: `/jobs/${jobId}/specification`, schema: specificationRowSchema });

export function useSpecification(jobId: string) {
  const { rows, ...rest } = useRows(rowsOf(jobId));
  return { specification: rows, ...rest };
}

export const useSpecificationActions = (jobId: string) =>
  useRowActions<SpecificationRowInput, SpecificationRow>(rowsOf(jobId), `/jobs/${jobId}`);
