import { serviceSchema, type Service, type ServiceInput } from '@/api/contracts/service';
import { useRowActions, useRows } from '@/hooks/use-job-rows';

const rowsOf = (jobId: string) => ({ path: `/jobs/${jobId}/services`, schema: serviceSchema });

export function useServices(jobId: string) {
  const { rows, ...rest } = useRows(rowsOf(jobId));
  return { services: rows, ...rest };
}

export const useServiceActions = (jobId: string) =>
  useRowActions<ServiceInput, Service>(rowsOf(jobId), `/jobs/${jobId}`);
