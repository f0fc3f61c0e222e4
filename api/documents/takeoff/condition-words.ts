import type { ServiceLimit } from '@/api/contracts/service';
import type { Locale } from '@/api/documents/locale';
import type { ConditionSet, Reach } from '@/api/engine/limits/study-types';

export const setWords: Record<ConditionSet, string> = {
  hottest: 'Hottest air, still',
  mostHumid: 'Most humid credible air, still',
  coldest: 'Coldest air',
  warmest: 'Warmest air',
  mean: 'Mean air',
};

export const reachWords: Record<Reach, string> = {
  nobody: 'nobody can reach it',
  trained: 'trained people can reach it',
  public: 'the public can reach it',
};

/** A limit of a service with its value. */
export function limitText(limit: ServiceLimit, locale: Locale): string {
  if (limit.kind === 'dew-point') return `dew point + ${locale.withUnit('difference', limit.margin.value, 1)}`;
  if (limit.kind !== 'heat-flow')
    return { touch: 'touch', 'energy-code': 'energy code', material: 'material' }[limit.kind];
  const perLength = limit.perLength && locale.withUnit('heatPerLength', limit.perLength.value);
  const flux = limit.flux && locale.withUnit('heatFlux', limit.flux.value);
  return `heat flow at most ${[perLength, flux].filter(Boolean).join(' and ')}`;
}
