import type { DefaultValues } from 'react-hook-form';

import type { ServiceInput, ServiceLimit } from '@/api/contracts/service';

export type Nature = 'hot' | 'cold' | 'both';
type State = ServiceInput['states'][number];

export const natureOf = (states: readonly Pick<State, 'nature'>[]): Nature =>
  states.length > 1 ? 'both' : (states[0]?.nature ?? 'hot');

/** A limit with nothing in it yet, for one place or (null) wherever the service runs. */
export function blankLimit(kind: ServiceLimit['kind'], placeId: string | null): ServiceLimit {
  if (kind === 'dew-point') return { kind, placeId, margin: { value: 1 } };
  if (kind === 'heat-flow') return { kind, placeId, perLength: null, flux: null };
  return { kind, placeId };
}

const usual: Record<Nature, readonly ServiceLimit['kind'][]> = {
  hot: ['touch', 'energy-code', 'material'],
  cold: ['dew-point', 'energy-code', 'material'],
  both: ['touch', 'dew-point', 'energy-code', 'material'],
};

/** The limits that usually apply: a hot surface can burn, a cold one can sweat. */
export const usualLimits = (nature: Nature): ServiceLimit[] => usual[nature].map((kind) => blankLimit(kind, null));

/** Whether these are just the usual ones, so that they may follow when the nature changes. */
export const areUsual = (limits: readonly ServiceLimit[], nature: Nature): boolean =>
  limits.length === usual[nature].length &&
  limits.every((limit) => limit.placeId === null && usual[nature].includes(limit.kind));

/** The states of another nature, keeping the temperatures that still have a place. */
export function statesAs<Kept extends { nature: 'hot' | 'cold' }>(nature: Nature, states: readonly Kept[]): Kept[] {
  const [first] = states;
  if (!first) return [];
  const of = (wanted: 'hot' | 'cold') => states.find((state) => state.nature === wanted);
  if (nature === 'both') return [of('hot') ?? emptied(first, 'hot'), of('cold') ?? emptied(first, 'cold')];
  return [of(nature) ?? { ...first, nature }];
}

/** The second state has temperatures of its own. */
const emptied = <Kept extends { nature: 'hot' | 'cold' }>(state: Kept, nature: 'hot' | 'cold'): Kept => ({
  ...state,
  nature,
  operating: undefined,
  lowest: undefined,
  highest: undefined,
});

export const blankService = (position: number): DefaultValues<ServiceInput> => ({
  name: '',
  fluid: '',
  states: [{ nature: 'hot' }],
  codeExempt: '',
  limits: usualLimits('hot'),
  note: '',
  position,
});
