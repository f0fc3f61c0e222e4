import type { DefaultValues } from 'react-hook-form';

import type { JobInput } from '@/api/contracts/job';
import type { Session } from '@/api/contracts/session';

/** A new job begins with what the firm is used to. */
export const blankJob = ({ currency }: Session['firm'], codeEdition: string): DefaultValues<JobInput> => ({
  number: '',
  name: '',
  site: '',
  scope: '',
  contactIds: [],
  bidDue: null,
  currency,
  codeEdition,
  climateZone: '',
  documentUnits: 'SI',
  seriesUnit: 'in',
  surfaceMethod: 'astm-c680',
  specification: { number: '', title: '', revision: '', date: null },
});
