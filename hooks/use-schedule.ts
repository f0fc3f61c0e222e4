import useSWR from 'swr';

import { scheduleSchema, takeoffSchema, type Schedule, type Takeoff } from '@/api/contracts/schedule';
import { request, type RequestFailed } from '@/hooks/request';

export function useSchedule(jobId: string) {
  const { data, error, mutate } = useSWR<Schedule, RequestFailed>(`/jobs/${jobId}/schedule`, (path: string) =>
    request(path, scheduleSchema),
  );
  return { schedule: data, problem: error?.problem, reload: () => void mutate() };
}

export function useTakeoff(jobId: string) {
  const { data, error, mutate } = useSWR<Takeoff, RequestFailed>(`/jobs/${jobId}/takeoff`, (path: string) =>
    request(path, takeoffSchema),
  );
  return { takeoff: data, problem: error?.problem, reload: () => void mutate() };
}
