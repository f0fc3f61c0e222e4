import type { SWRConfiguration } from 'swr';

import { RequestFailed } from '@/hooks/request';

const mayPass = (error: unknown) =>
  !(error instanceof RequestFailed) || error.problem.status === 0 || error.problem.status >= 500;

/** A refusal stays a refusal, so only what may pass by itself is asked again. */
export const swrSettings: SWRConfiguration = {
  shouldRetryOnError: mayPass,
  errorRetryInterval: 4000,
  keepPreviousData: false,
};
