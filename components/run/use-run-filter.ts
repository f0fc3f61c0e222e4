import { useLocalSearchParams, useRouter } from 'expo-router';

import { filterKeys, type FilterKey, type RunFilter } from './run-filters';

/** What the list is narrowed to, read from the page's address and written into it. */
export function useRunFilter() {
  const router = useRouter();
  const params = useLocalSearchParams<Partial<Record<FilterKey, string>>>();
  const filter: RunFilter = Object.fromEntries(filterKeys.flatMap((key) => (params[key] ? [[key, params[key]]] : [])));
  return {
    filter,
    change: (key: FilterKey, value: string) => router.setParams({ [key]: value || undefined }),
    clear: () => router.setParams(Object.fromEntries(filterKeys.map((key) => [key, undefined]))),
  };
}
