import type { Run } from '@/api/contracts/run';
import { runStudySchema, type Candidate, type LimitVerdict, type RunStudy } from '@/api/contracts/study';

/** Numbers of the demo's run R30 (DN 100, steam at 184 °C, air at 40 °C): here they are only put on a screen. */
const rows: [name: Candidate['name'], outside: number, surface: number, heat: number][] = [
  [null, 0.1143, 184, 831.9],
  ['in:1', 0.1681, 71.1, 84],
  ['in:1.5', 0.1935, 63, 64.9],
  ['in:2', 0.2189, 58.2, 54.1],
  ['in:3', 0.2731, 52.6, 41.7],
  ['in:4', 0.3238, 49.8, 35.4],
  ['in:4.5', 0.3556, 48.6, 32.7],
];
const judgedAt = {
  set: 'hottest' as const,
  fluid: 184,
  air: 40,
  humidity: null,
  wind: 0,
  emittance: 0.1,
  source: 'Walk',
};
const empty = { unit: null, state: null, dewPoint: null, sweatsFrom: null, value: null, limit: null, margin: null };

const touch = (surface: number): LimitVerdict => ({
  ...empty,
  kind: 'touch',
  verdict: surface <= 60 ? 'met' : 'not-met',
  because: ['the surface reaches ', { kind: 'temperature', value: surface }],
  value: surface,
  limit: 60,
  margin: 60 - surface,
  unit: 'temperature',
  judgedAt,
  source: 'Project figure',
});
const code = (isMet: boolean): LimitVerdict => ({
  ...empty,
  kind: 'energy-code',
  verdict: isMet ? 'met' : 'not-met',
  because: ['the table entered asks for ', { thickness: ['in:4.5'] }],
  judgedAt: null,
  source: 'Table entered',
});

const candidates: Candidate[] = rows.map(([name, outsideDiameter, surface, heatFlow]) => ({
  name,
  names: name ? [name] : [],
  outsideDiameter,
  layerThicknesses: name ? [(outsideDiameter - 0.1143) / 2] : [],
  basis: name ? 'made' : 'bare',
  heat: {
    heatFlow,
    flux: heatFlow / (Math.PI * outsideDiameter),
    surface: surface - 8,
    interfaces: [],
    meanConductivities: [],
    coefficient: 5,
    convective: 4,
    radiative: 1,
    closure: 0,
    judgedAt: { ...judgedAt, set: 'mean', fluid: 170, air: 33 },
    notes: [],
  },
  verdicts: [touch(surface), code(name === 'in:4.5')],
  meetsAll: surface <= 60 && name === 'in:4.5',
  notes: [],
}));

/** Drawn at 38 mm against a specification of 76 mm; 114 mm meets everything. */
export const steamStudy: RunStudy = runStudySchema.parse({
  runId: '3f0e1c52-0c5c-4c9a-8f0b-0d5a54c0d3aa',
  assembly: {
    source: 'chosen',
    specificationLabel: 'P02',
    reason: 'Drawn so',
    layers: [{ materialId: 'std/mf_pipe', materialName: 'Mineral fibre pipe section', thickness: 'in:1.5' }],
    finishId: 'std/aluminium-sheet',
    finishName: 'Bright aluminium jacket',
    vapourRetarder: 'none',
    codeExempt: '',
  },
  body: { shape: 'cylinder', width: 0.1143, height: 0.1143 },
  study: {
    candidates,
    specified: 2,
    proposed: 6,
    governing: 'energy-code',
    meets: [],
    sentence: [{ thickness: ['in:1.5'] }, ' is not enough. It would reach ', { kind: 'temperature', value: 63 }, '.'],
    whyNotThinner: [{ thickness: ['in:4'] }, ' falls one size short of the energy code.'],
    engineVersion: '1.0.0',
    method: 'astm-c680',
    notes: [],
  },
  used: 2,
});
export const hotSteam = { ...steamStudy, nature: 'hot' as const };

const layer = (thickness: 'in:1.5' | 'in:3') => ({ materialId: 'std/mf_pipe', thickness, installed: null });
export const steamRun: Run = {
  id: steamStudy.runId,
  version: 4,
  number: 'R30',
  title: '',
  serviceId: '7a1de6f5-2f43-4f5e-9d0f-bb6b0a3c4a01',
  placeId: '7a1de6f5-2f43-4f5e-9d0f-bb6b0a3c4a02',
  levelId: '7a1de6f5-2f43-4f5e-9d0f-bb6b0a3c4a03',
  drawingId: null,
  shape: {
    kind: 'pipe',
    size: { standard: 'asme-steel', nominal: 'NPS 4' },
    length: { value: 86 },
    orientation: 'horizontal',
  },
  elevation: null,
  fittings: {},
  status: 'measured',
  hold: null,
  override: {
    reason: 'Drawn so',
    state: null,
    layers: [layer('in:1.5')],
    finishId: null,
    vapourRetarder: null,
    codeExempt: '',
  },
  note: '',
};

export const steamRow = {
  id: '7a1de6f5-2f43-4f5e-9d0f-bb6b0a3c4a04',
  version: 1,
  label: 'P02',
  serviceId: steamRun.serviceId,
  appliesTo: 'pipe' as const,
  placeIds: [],
  fromDn: null,
  toDn: null,
  layers: [layer('in:3')],
  finishId: 'std/aluminium-sheet',
  vapourRetarder: 'none' as const,
  note: '',
};
