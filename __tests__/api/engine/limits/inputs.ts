import type { Body, Conditions, FluidState, PlaceInput, StudyInput } from '@/api/engine/limits/study-types';
import { finish, material } from '@/api/engine/standards/library';
import { findPipeSize } from '@/api/engine/standards/pipe-sizes';
import type { PipeStandard } from '@/api/engine/standards/rows';
import type { ThicknessName } from '@/api/engine/standards/thickness-name';

/** Inputs of the engine's tests: invented places and services, changed one thing at a time. */
export function pipe(standard: PipeStandard, nominal: string): Body {
  const outsideDiameter = findPipeSize(standard, nominal)?.outsideDiameter ?? NaN;
  return { shape: 'pipe', standard, nominal, outsideDiameter, orientation: 'horizontal', height: null };
}

export const air = (dryBulb: number, humidity: number | null = null, wind = 0): Conditions => ({
  air: dryBulb,
  humidity,
  wind,
  source: 'invented',
});

export const plantRoom: PlaceInput = {
  name: 'Plant room',
  reach: 'trained',
  touchLimit: 60,
  touchLimitSource: 'invented',
  outdoor: false,
  plenum: false,
  ductLocation: 'unconditioned_space_and_buried',
  conditions: { hottest: air(40), mostHumid: air(35, 60), coldest: air(15), warmest: air(40), mean: air(30) },
};

export const steam: FluidState = { nature: 'hot', operating: 170, lowest: 160, highest: 184 };
export const chilled: FluidState = { nature: 'cold', operating: 6, lowest: 5, highest: 15 };

export const layer = (id: string, thickness: ThicknessName | null, installed: number | null = null) => ({
  material: material(`std/${id}`),
  thickness,
  installed,
});

export const steamInput: StudyInput = {
  body: pipe('asme-steel', 'NPS 4'),
  layers: [layer('mf_pipe', 'in:1.5')],
  finish: finish('std/aluminium-sheet'),
  vapourRetarder: 'none',
  states: [steam],
  place: plantRoom,
  limits: [{ kind: 'touch' }, { kind: 'energy-code' }, { kind: 'material' }],
  codeEdition: 'ashrae-90.1-2019',
  climateZone: '4A',
  codeExempt: null,
  altitude: 8,
  method: 'astm-c680',
  seriesUnit: 'in',
};

export const chilledInput: StudyInput = {
  ...steamInput,
  body: pipe('asme-steel', 'NPS 6'),
  layers: [layer('mf_pipe', 'in:2')],
  finish: finish('std/pvc-jacket'),
  vapourRetarder: 'sealed-facing',
  states: [chilled],
  limits: [{ kind: 'dew-point', margin: 1 }, { kind: 'energy-code' }, { kind: 'material' }],
};

export const ductInput: StudyInput = {
  ...chilledInput,
  body: { shape: 'rectangular-duct', width: 0.9, height: 0.6 },
  layers: [layer('mf_board', 'in:2')],
  finish: finish('std/all-service-jacket'),
  states: [{ nature: 'cold', operating: 13, lowest: 12, highest: 26 }],
};
