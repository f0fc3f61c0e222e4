import type { AddendumInput, DrawingInput, LevelInput } from '@/api/contracts/basis';
import type { BuildUpInput, SpecificationRowInput } from '@/api/contracts/build-up';
import type { ContactInput } from '@/api/contracts/contact';
import type { JobInput } from '@/api/contracts/job';
import type { ConditionsOfPlace, PlaceInput } from '@/api/contracts/place';
import { readQuantity, type Quantity, type QuantityKind } from '@/api/contracts/quantities';
import type { RunInput } from '@/api/contracts/run';
import type { ServiceInput } from '@/api/contracts/service';

/** A quantity as a person types it. */
export function typed(kind: QuantityKind, text: string): Quantity {
  const reading = readQuantity(kind, text, 'SI');
  if (!('quantity' in reading)) throw new Error(`${text}: ${reading.problem}`);
  return reading.quantity;
}

export const contactInput: ContactInput = {
  name: 'Clara Client',
  company: 'Client and Sons',
  email: 'clara@client.example',
  role: 'Project manager',
};

export const jobInput: JobInput = {
  number: 'TST-001',
  name: 'Boiler house',
  site: 'Testerton',
  scope: 'Steam and chilled water.\nTwo phases.',
  contactIds: [],
  bidDue: { date: '2026-12-18', time: '14:00', zone: 'Europe/Dublin' },
  currency: 'EUR',
  codeEdition: 'ashrae-90.1-2019',
  climateZone: '4A',
  altitude: typed('altitude', '120 ft'),
  documentUnits: 'SI',
  seriesUnit: 'in',
  surfaceMethod: 'astm-c680',
  specification: { number: '23 07 00', title: 'Insulation', revision: 'for bid', date: '2026-11-20' },
};

export const levelInput: LevelInput = { name: 'Level 1', position: 1 };
export const drawingInput: DrawingInput = {
  number: 'M-201',
  title: 'Plumbing',
  revision: '2',
  date: '2026-11-01',
  scale: '1:100',
};
export const addendumInput: AddendumInput = {
  number: 1,
  date: '2026-11-28',
  changes: 'Roof finish changed.\nRun added.',
  acknowledged: true,
};

const air = (temperature: string, humidity: string): ConditionsOfPlace & { humidity: Quantity } => ({
  air: typed('temperature', temperature),
  humidity: typed('humidity', humidity),
  wind: typed('speed', '0'),
  source: 'Design note 4',
});

export const placeInput: PlaceInput = {
  name: 'Plant room',
  reach: 'trained',
  touchLimit: typed('temperature', '140 °F'),
  touchLimitSource: 'Common practice for metal and 5 s',
  outdoor: false,
  plenum: false,
  ductLocation: 'indirectly_conditioned',
  note: 'Warm and damp',
  conditions: {
    hottest: { ...air('40', '40'), humidity: null },
    mostHumid: air('28', '75'),
    coldest: air('18', '50'),
    warmest: air('32', '50'),
    mean: air('25', '50'),
  },
};

export const serviceInput: ServiceInput = {
  name: 'Heating flow',
  fluid: 'water',
  states: [
    {
      nature: 'hot',
      operating: typed('temperature', '82'),
      lowest: typed('temperature', '60'),
      highest: typed('temperature', '95'),
    },
  ],
  hours: typed('hours', '4200'),
  codeExempt: '',
  limits: [
    { kind: 'touch', placeId: null },
    { kind: 'energy-code', placeId: null },
    { kind: 'dew-point', placeId: null, margin: typed('difference', '1') },
    { kind: 'heat-flow', placeId: null, perLength: typed('heatPerLength', '20 W/m'), flux: null },
    { kind: 'material', placeId: null },
  ],
  note: '',
  position: 1,
};

export const buildUpInput = (serviceId: string): BuildUpInput => ({
  serviceId,
  appliesTo: 'pipe',
  placeIds: [],
  fromDn: 15,
  toDn: 100,
  layers: [
    { materialId: 'std/mf_pipe', thickness: 'in:1.5', installed: null },
    { materialId: 'std/mf_pipe', thickness: null, installed: null },
  ],
  finishId: 'std/pvc-jacket',
  vapourRetarder: 'none',
  note: '',
});

export const specificationInput = (serviceId: string): SpecificationRowInput => ({
  ...buildUpInput(serviceId),
  label: 'P01',
  layers: [{ materialId: 'std/mf_blanket_wrap', thickness: 'in:2', installed: typed('dimension', '38.1') }],
});

export type RunPlace = Pick<RunInput, 'serviceId' | 'placeId' | 'levelId' | 'drawingId'>;

export const runInput = (place: RunPlace, number = 'R01'): RunInput => ({
  number,
  title: 'Main',
  ...place,
  shape: {
    kind: 'pipe',
    size: { standard: 'asme-steel', nominal: 'NPS 2' },
    length: typed('length', '150 ft'),
    orientation: 'horizontal',
  },
  elevation: typed('elevation', '3.2'),
  fittings: { 'elbow-90': 4, tee: 5, hanger: 24 },
  status: 'measured',
  hold: null,
  override: null,
  note: 'Walked',
});
