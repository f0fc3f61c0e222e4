import type { PlaceInput } from '@/api/contracts/place';

import { celsius, typed } from './typed';

const note4 = "Engineer's design note 4";
const agreed = 'Agreed with the facility manager';
const walked = 'Site walk, measured';
const practice = 'Common practice, no source';
const usual = 'Usual project figure for metal and 5 s contact, ASTM C1055';

type Air = { air: number; humidity?: number; wind?: number; source: string };
type DemoPlace = Omit<PlaceInput, 'conditions' | 'touchLimit'> & {
  touchLimit: number | null;
  air: Record<'hottest' | 'coldest' | 'warmest' | 'mean', Air> & { mostHumid: Air & { humidity: number } };
};

const conditions = ({ air, wind = 0, source }: Air) => ({
  air: celsius(air),
  humidity: null,
  wind: typed('speed', `${wind} m/s`),
  source,
});
const place = ({ air, touchLimit, ...rest }: DemoPlace): PlaceInput => ({
  ...rest,
  touchLimit: touchLimit === null ? null : celsius(touchLimit),
  conditions: {
    hottest: conditions(air.hottest),
    mostHumid: { ...conditions(air.mostHumid), humidity: typed('humidity', `${air.mostHumid.humidity} %`) },
    coldest: conditions(air.coldest),
    warmest: conditions(air.warmest),
    mean: conditions(air.mean),
  },
});

const withinReach = {
  reach: 'trained',
  touchLimit: 60,
  touchLimitSource: usual,
  outdoor: false,
  plenum: false,
} as const;
const outOfReach = { reach: 'nobody', touchLimit: null, touchLimitSource: '', outdoor: false } as const;

export const demoPlaces = {
  'ceiling-void': place({
    ...outOfReach,
    name: 'Concealed ceiling void',
    plenum: true,
    ductLocation: 'indirectly_conditioned',
    note: 'Runs warmer and damper than the ward below: do not use the room at 24 °C and 50 %',
    air: {
      hottest: { air: 32, source: note4 },
      mostHumid: { air: 28, humidity: 75, source: agreed },
      coldest: { air: 18, source: note4 },
      warmest: { air: 32, source: note4 },
      mean: { air: 25, source: practice },
    },
  }),
  'ward-corridor': place({
    name: 'Exposed ward corridor',
    reach: 'public',
    touchLimit: 43,
    touchLimitSource: 'The hospital asks 43 °C: patients within reach below 2.4 m',
    outdoor: false,
    plenum: false,
    ductLocation: null,
    note: '',
    air: {
      hottest: { air: 28, source: note4 },
      mostHumid: { air: 24, humidity: 60, source: note4 },
      coldest: { air: 20, source: note4 },
      warmest: { air: 28, source: note4 },
      mean: { air: 22, source: practice },
    },
  }),
  'plant-room': place({
    ...withinReach,
    name: 'Plant room',
    ductLocation: 'unconditioned_space_and_buried',
    note: 'Boilers running: 34 to 36 °C measured on the walk, 40 °C taken as hottest',
    air: {
      hottest: { air: 40, source: note4 },
      mostHumid: { air: 35, humidity: 60, source: walked },
      coldest: { air: 15, source: note4 },
      warmest: { air: 40, source: note4 },
      mean: { air: 30, source: practice },
    },
  }),
  roof: place({
    ...withinReach,
    name: 'Roof, outdoors',
    outdoor: true,
    ductLocation: 'exterior',
    note: 'Sun and clear night sky are not counted',
    air: {
      hottest: { air: 36, source: note4 },
      mostHumid: { air: 32, humidity: 85, source: agreed },
      coldest: { air: -12, wind: 6, source: note4 },
      warmest: { air: 36, wind: 3, source: note4 },
      mean: { air: 11, wind: 2, source: practice },
    },
  }),
  'crawl-space': place({
    ...withinReach,
    name: 'Crawl space',
    ductLocation: null,
    note: '0.9 m headroom, permit entry, damp soil',
    air: {
      hottest: { air: 26, source: note4 },
      mostHumid: { air: 22, humidity: 90, source: walked },
      coldest: { air: 8, source: note4 },
      warmest: { air: 26, source: note4 },
      mean: { air: 16, source: practice },
    },
  }),
  tunnel: place({
    ...withinReach,
    name: 'Service tunnel',
    ductLocation: null,
    note: 'Steam tunnel, heat-stress plan; no telephone signal',
    air: {
      hottest: { air: 40, source: walked },
      mostHumid: { air: 38, humidity: 60, source: note4 },
      coldest: { air: 22, source: note4 },
      warmest: { air: 40, source: walked },
      mean: { air: 33, source: practice },
    },
  }),
  laundry: place({
    ...withinReach,
    name: 'Laundry, wash-down',
    ductLocation: null,
    note: 'Hosed daily: sealed smooth jacket',
    air: {
      hottest: { air: 35, source: note4 },
      mostHumid: { air: 30, humidity: 80, source: agreed },
      coldest: { air: 16, source: note4 },
      warmest: { air: 35, source: note4 },
      mean: { air: 26, source: practice },
    },
  }),
  'intake-void': place({
    ...outOfReach,
    name: 'Ceiling void at the outside-air intake, winter',
    plenum: false,
    ductLocation: null,
    note: 'Humidified ward air fills the void while the intake air is at its coldest: the humid set here is a winter one',
    air: {
      hottest: { air: 28, source: note4 },
      mostHumid: { air: 24, humidity: 65, source: agreed },
      coldest: { air: 18, source: note4 },
      warmest: { air: 28, source: note4 },
      mean: { air: 22, source: practice },
    },
  }),
} as const satisfies Record<string, PlaceInput>;
export type PlaceKey = keyof typeof demoPlaces;
