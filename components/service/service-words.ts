import type { FluidStateOfService, Service, ServiceLimit } from '@/api/contracts/service';
import type { UnitSystem } from '@/api/contracts/quantities';

import { degreesText, plainText } from '@/components/place/place-words';

export const natureWords = { hot: 'hot', cold: 'cold' } as const;

/** "hot", "cold" or "hot and cold". */
export const natureText = (states: readonly Pick<FluidStateOfService, 'nature'>[]): string =>
  states.map(({ nature }) => natureWords[nature]).join(' and ');

/** "170 °C", or both states of a dual-temperature service: "80 °C / 7 °C". */
export const operatingText = (states: readonly FluidStateOfService[], units: UnitSystem): string =>
  states.map(({ operating }) => degreesText(operating.value, units)).join(' / ');

export const rangeText = ({ lowest, highest }: FluidStateOfService, units: UnitSystem): string =>
  `${degreesText(lowest.value, units)} to ${degreesText(highest.value, units)}`;

type LimitWords = { kind: ServiceLimit['kind']; title: string; asks: string };

/** The limits that are built, in the order in which a schedule names them. */
export const serviceLimitWords: readonly LimitWords[] = [
  {
    kind: 'touch',
    title: 'Touch',
    asks: "the surface stays at or below the place's touch limit, where people can reach it",
  },
  { kind: 'dew-point', title: 'Dew point', asks: 'the surface stays above the dew point, so that it does not sweat' },
  { kind: 'energy-code', title: 'Energy code', asks: "the thickness meets the table of the job's code edition" },
  { kind: 'heat-flow', title: 'Heat flow', asks: 'the heat lost or gained stays within a figure of its own' },
  { kind: 'material', title: 'Material', asks: 'every layer and the finish stay within their temperature limits' },
];

/** "dew point + 1 K", "heat flow 20 W/m", "touch". */
export function limitText(limit: ServiceLimit, units: UnitSystem): string {
  if (limit.kind === 'dew-point') return `dew point + ${plainText('difference', limit.margin.value, units)}`;
  if (limit.kind === 'heat-flow') return `heat flow ${flowText(limit, units)}`;
  return { touch: 'touch', 'energy-code': 'energy code', material: 'material' }[limit.kind];
}

function flowText({ perLength, flux }: Extract<ServiceLimit, { kind: 'heat-flow' }>, units: UnitSystem): string {
  return [
    ...(perLength ? [plainText('heatPerLength', perLength.value, units)] : []),
    ...(flux ? [plainText('heatFlux', flux.value, units)] : []),
  ].join(' or ');
}

type Places = readonly { id: string; name: string }[];

/** "touch, energy code, material; heat flow 20 W/m on Roof, outdoors". */
export function limitsText({ limits }: Pick<Service, 'limits'>, places: Places, units: UnitSystem): string {
  const general = limits.filter(({ placeId }) => placeId === null).map((limit) => limitText(limit, units));
  const placed = limits.flatMap((limit) => {
    const place = places.find(({ id }) => id === limit.placeId);
    return place ? [`${limitText(limit, units)} in ${place.name}`] : [];
  });
  return [general.join(', ') || 'no limit', ...placed].join('; ');
}
