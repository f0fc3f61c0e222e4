import type { JudgedRun } from '@/api/contracts/judgement';
import type { Run, Shape } from '@/api/contracts/run';
import type { RunRow } from '@/components/run/run-row';

export const pipeOf = (length: number): Shape => ({
  kind: 'pipe',
  size: { standard: 'asme-steel', nominal: 'NPS 4' },
  length: { value: length },
  orientation: 'horizontal',
});

/** An invented run, with what a test says otherwise. */
export const aRun = (given: Partial<Run> = {}): Run => ({
  id: given.number ?? 'R30',
  version: 1,
  number: 'R30',
  title: '',
  serviceId: 'steam',
  placeId: 'tunnel',
  levelId: 'level 3',
  drawingId: null,
  shape: pipeOf(86),
  elevation: null,
  fittings: {},
  status: 'measured',
  hold: null,
  override: null,
  note: '',
  ...given,
});

export const judged = (flags: JudgedRun['flags'] = []): JudgedRun => ({
  runId: 'R30',
  assembly: {
    source: 'specified',
    specificationLabel: 'P02',
    reason: '',
    layers: [{ materialId: 'std/mf_pipe', materialName: 'Mineral fibre pipe section', thickness: 'in:1.5' }],
    finishId: 'std/aluminium-sheet',
    finishName: 'Bright aluminium jacket',
    vapourRetarder: 'none',
    codeExempt: '',
  },
  names: ['in:1.5'],
  outsideDiameter: 0.1935,
  layerThicknesses: [0.0396],
  body: { shape: 'cylinder', width: 0.1143, height: 0.1143 },
  nature: 'hot',
  surface: 63,
  heatFlow: 64.9,
  flux: 106,
  governing: 'energy-code',
  verdicts: [],
  flags,
  problem: null,
});

export const aRow = (run: Run, result?: JudgedRun): RunRow => ({
  run,
  judged: result,
  service: undefined,
  place: undefined,
  level: undefined,
  drawing: undefined,
  pipeSize: undefined,
});
