import type { ReactNode } from 'react';
import { SWRConfig } from 'swr';

import { swrSettings } from '@/hooks/swr-settings';

/** The client's data, remembered by nobody after the test. */
export const Client = ({ children }: { children: ReactNode }) => (
  <SWRConfig value={{ ...swrSettings, provider: () => new Map(), dedupingInterval: 0, shouldRetryOnError: false }}>
    {children}
  </SWRConfig>
);
