import useSWR from 'swr';
import type { z } from 'zod';

import {
  libraryCodeSchema,
  libraryFinishSchema,
  libraryMaterialSchema,
  libraryPipeSizeSchema,
  librarySafetySchema,
  librarySeriesSchema,
} from '@/api/contracts/library';
import { request, type RequestFailed } from '@/hooks/request';

// Standard rows are part of the program: while it runs they do not change.
const once = { revalidateIfStale: false, revalidateOnFocus: false, revalidateOnReconnect: false };

function usePart<Shape>(name: string, schema: z.ZodType<Shape>) {
  const load = (path: string) => request(path, schema);
  const { data, error, mutate } = useSWR<Shape, RequestFailed>(`/library/${name}`, load, once);
  return { data, problem: error?.problem, reload: () => void mutate() };
}

export const usePipeSizes = () => usePart('pipe-sizes', libraryPipeSizeSchema.array());
export const useMaterials = () => usePart('materials', libraryMaterialSchema.array());
export const useFinishes = () => usePart('finishes', libraryFinishSchema.array());
export const useSeries = () => usePart('series', librarySeriesSchema.array());
export const useCodes = () => usePart('codes', libraryCodeSchema.array());
export const useSafety = () => usePart('safety', librarySafetySchema);
