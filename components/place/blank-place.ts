import type { DefaultValues } from 'react-hook-form';

import type { PlaceInput } from '@/api/contracts/place';

const still = { wind: { value: 0 }, humidity: null, source: '' };

/** A place of which nothing is known yet: indoors, out of reach, still air. */
export const blankPlace: DefaultValues<PlaceInput> = {
  name: '',
  reach: 'nobody',
  touchLimit: null,
  touchLimitSource: '',
  outdoor: false,
  plenum: false,
  ductLocation: null,
  note: '',
  conditions: {
    hottest: still,
    mostHumid: { ...still, humidity: undefined },
    coldest: still,
    warmest: still,
    mean: still,
  },
};
