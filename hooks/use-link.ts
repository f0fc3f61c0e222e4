import useSWR from 'swr';

import { linkViewSchema, type LinkView } from '@/api/contracts/link';
import { request, type RequestFailed } from '@/hooks/request';

/** What was sent through a private link; read once, since each reading is recorded as an opening. */
export function useLink(token: string) {
  const { data, error, mutate } = useSWR<LinkView, RequestFailed>(
    `/links/${token}`,
    (path: string) => request(path, linkViewSchema),
    { revalidateOnFocus: false, revalidateOnReconnect: false, revalidateIfStale: false },
  );
  return { link: data, problem: error?.problem, reload: () => void mutate() };
}
