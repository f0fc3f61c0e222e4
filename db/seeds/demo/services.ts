import type { ServiceInput, ServiceLimit } from '@/api/contracts/service';

import type { PlaceKey } from './places';
import { celsius, typed } from './typed';

/** A limit names its place by key until the places have ids. */
type Placed<Limit> = Limit extends ServiceLimit ? Omit<Limit, 'placeId'> & { place: PlaceKey | null } : never;
export type DemoLimit = Placed<ServiceLimit>;
export type DemoService = Omit<ServiceInput, 'limits' | 'position'> & { limits: DemoLimit[] };

const codeAndMaterial: DemoLimit[] = [
  { kind: 'energy-code', place: null },
  { kind: 'material', place: null },
];
const hotLimits: DemoLimit[] = [{ kind: 'touch', place: null }, ...codeAndMaterial];
const coldLimits: DemoLimit[] = [
  { kind: 'dew-point', place: null, margin: typed('difference', '1 K') },
  ...codeAndMaterial,
];

type Rest = { name: string; fluid: string; hours: number; codeExempt?: string; note?: string };
type Temperatures = [operating: number, lowest: number, highest: number];

const service = (nature: 'hot' | 'cold', [operating, lowest, highest]: Temperatures, rest: Rest): DemoService => ({
  name: rest.name,
  fluid: rest.fluid,
  states: [{ nature, operating: celsius(operating), lowest: celsius(lowest), highest: celsius(highest) }],
  hours: typed('hours', `${rest.hours} h`),
  codeExempt: rest.codeExempt ?? '',
  limits: nature === 'hot' ? hotLimits : coldLimits,
  note: rest.note ?? '',
});

const chilled = service('cold', [6, 5, 15], { name: 'Chilled water, flow and return', fluid: 'water', hours: 5200 });

/** In the order in which a schedule names them. */
export const demoServices = {
  steam: service('hot', [170, 160, 184], { name: 'Steam, 7 bar gauge', fluid: 'steam', hours: 8000 }),
  condensate: service('hot', [95, 80, 110], { name: 'Pumped condensate', fluid: 'water', hours: 8000 }),
  'heating-flow': service('hot', [82, 60, 95], { name: 'Heating water, flow', fluid: 'water', hours: 4200 }),
  'heating-return': service('hot', [65, 45, 95], { name: 'Heating water, return', fluid: 'water', hours: 4200 }),
  'domestic-hot': service('hot', [60, 55, 70], {
    name: 'Domestic hot water and circulation',
    fluid: 'water',
    hours: 8760,
    note: "Temperatures follow the hospital's water-safety plan",
  }),
  'domestic-cold': service('cold', [12, 10, 20], {
    name: 'Domestic cold water',
    fluid: 'water',
    hours: 8760,
    codeExempt: 'the fluid is neither heated nor cooled with fuel or electricity',
  }),
  chilled: {
    ...chilled,
    limits: [
      ...coldLimits,
      { kind: 'heat-flow', place: 'roof', perLength: typed('heatPerLength', '20 W/m'), flux: null },
    ],
  },
  'refrigerant-suction': service('cold', [5, -7, 10], {
    name: 'Refrigerant suction',
    fluid: 'refrigerant vapour',
    hours: 5200,
  }),
  'supply-air': service('cold', [13, 12, 26], { name: 'Supply air', fluid: 'air', hours: 6000, note: 'Cooling only' }),
  'outside-air': service('cold', [8, -12, 36], {
    name: 'Outside air',
    fluid: 'air',
    hours: 6000,
    codeExempt: 'the duct table entered covers supply and return ducts',
  }),
} as const satisfies Record<string, DemoService>;
export type ServiceKey = keyof typeof demoServices;
