import type { ConditionsOfPlace, Place } from '@/api/contracts/place';
import type { Service } from '@/api/contracts/service';

/** Places and services of an invented job: enough of each for every part of a document. */
export const idOf = (number: number) => `00000000-0000-4000-8000-${String(number).padStart(12, '0')}`;

const air = (value: number, humidity: number | null, wind: number): ConditionsOfPlace => ({
  air: { value },
  humidity: humidity === null ? null : { value: humidity },
  wind: { value: wind },
  source: 'Design note 2, table 1',
});

type Airs = Record<'hottest' | 'mostHumid' | 'coldest' | 'warmest' | 'mean', number>;
function place(number: number, name: string, airs: Airs): Place {
  return {
    id: idOf(number),
    version: 1,
    name,
    reach: 'trained',
    touchLimit: { value: 60 },
    touchLimitSource: 'Project figure, specification 2.3',
    outdoor: false,
    plenum: false,
    ductLocation: null,
    note: '',
    conditions: {
      hottest: air(airs.hottest, null, 0),
      mostHumid: { ...air(airs.mostHumid, 85, 0), humidity: { value: 85 } },
      coldest: air(airs.coldest, null, 0),
      warmest: air(airs.warmest, null, 0),
      mean: air(airs.mean, null, 0),
    },
  };
}

export const places: Place[] = [
  place(101, 'Pool plant room', { hottest: 38, mostHumid: 30, coldest: 12, warmest: 38, mean: 28 }),
  {
    ...place(102, 'Ceiling void over the changing rooms', {
      hottest: 33,
      mostHumid: 29,
      coldest: 18,
      warmest: 33,
      mean: 25,
    }),
    reach: 'nobody',
    touchLimit: null,
    touchLimitSource: '',
    plenum: true,
    note: 'Damper than the changing rooms below it.',
  },
  {
    ...place(103, 'Roof', { hottest: 36, mostHumid: 31, coldest: -8, warmest: 36, mean: 11 }),
    outdoor: true,
    reach: 'public',
    touchLimit: { value: 55 },
  },
];

function service(number: number, name: string, fluid: string): Service {
  return {
    id: idOf(number),
    version: 1,
    name,
    fluid,
    states: [{ nature: 'hot', operating: { value: 82 }, lowest: { value: 60 }, highest: { value: 90 } }],
    hours: { value: 6200 },
    codeExempt: '',
    limits: [
      { kind: 'touch', placeId: null },
      { kind: 'energy-code', placeId: null },
      { kind: 'material', placeId: null },
    ],
    note: '',
    position: number,
  };
}
const cold = (operating: number, lowest: number): Service['states'] => [
  { nature: 'cold', operating: { value: operating }, lowest: { value: lowest }, highest: { value: 16 } },
];
const coldLimits: Service['limits'] = [
  { kind: 'dew-point', placeId: null, margin: { value: 1 } },
  { kind: 'energy-code', placeId: null },
  { kind: 'heat-flow', placeId: idOf(103), perLength: { value: 18 }, flux: null },
  { kind: 'material', placeId: null },
];

export const services: Service[] = [
  service(201, 'Heating flow', 'water'),
  { ...service(202, 'Domestic hot water', 'water'), hours: { value: 8760 } },
  { ...service(203, 'Chilled water', 'water'), states: cold(6, 5), limits: coldLimits },
  { ...service(204, 'Supply air', 'air'), states: cold(13, 11), limits: coldLimits.slice(0, 2) },
  {
    ...service(205, 'Changeover coil water', 'water'),
    states: [...service(205, '', 'water').states, ...cold(7, 6)],
    limits: [...service(205, '', 'water').limits, ...coldLimits.slice(0, 1)],
  },
];
