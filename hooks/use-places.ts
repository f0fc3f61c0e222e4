import { placeSchema, type Place, type PlaceInput } from '@/api/contracts/place';
import { useRowActions, useRows } from '@/hooks/use-job-rows';

const rowsOf = (jobId: string) => ({ path: `/jobs/${jobId}/places`, schema: placeSchema });

export function usePlaces(jobId: string) {
  const { rows, ...rest } = useRows(rowsOf(jobId));
  return { places: rows, ...rest };
}

export const usePlaceActions = (jobId: string) => useRowActions<PlaceInput, Place>(rowsOf(jobId), `/jobs/${jobId}`);
