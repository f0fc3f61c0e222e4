import { randomUUID } from 'node:crypto';

import type { BuildUp, Layer, SpecificationRow } from '@/api/contracts/build-up';
import type { JobData } from '@/api/contracts/job-data';
import type { Override, Run, Shape } from '@/api/contracts/run';
import type { Service } from '@/api/contracts/service';
import { demoInMemory } from '@/db/seeds/demo/in-memory';

/** The demo's places and services under an empty specification, for one rule at a time. */
export async function smallJob() {
  const demo = await demoInMemory('revision-a');
  const service = (name: string): Service => named(demo.services, name);
  const place = (name: string) => named(demo.places, name);
  const levelId = demo.levels[0]!.id;
  const steam = service('Steam, 7 bar gauge');
  const plantRoom = place('Plant room');

  const run = (change: Partial<Run> = {}): Run => ({
    id: randomUUID(),
    version: 1,
    number: 'R1',
    title: '',
    serviceId: steam.id,
    placeId: plantRoom.id,
    levelId,
    drawingId: null,
    shape: steelPipe('NPS 2'),
    elevation: null,
    fittings: {},
    status: 'measured',
    hold: null,
    override: null,
    note: '',
    ...change,
  });
  const row = (change: Partial<SpecificationRow> = {}): SpecificationRow => ({
    ...scope(steam.id),
    label: 'S1',
    layers: [mineralFibre('in:2')],
    ...change,
  });
  const buildUp = (change: Partial<BuildUp> = {}): BuildUp => ({
    ...scope(steam.id),
    layers: [mineralFibre(null)],
    ...change,
  });
  const job = (parts: Partial<JobData>): JobData => ({ ...demo, specification: [], buildUps: [], runs: [], ...parts });
  return { demo, job, run, row, buildUp, service, place, steam, plantRoom };
}

const scope = (serviceId: string) => ({
  id: randomUUID(),
  version: 1,
  serviceId,
  appliesTo: 'pipe' as const,
  placeIds: [],
  fromDn: null,
  toDn: null,
  finishId: 'std/aluminium-sheet',
  vapourRetarder: 'none' as const,
  note: '',
});

export const mineralFibre = (thickness: Layer['thickness']): Layer => ({
  materialId: 'std/mf_pipe',
  thickness,
  installed: null,
});

export const steelPipe = (nominal: string, metres = 10): Shape => ({
  kind: 'pipe',
  size: { standard: 'asme-steel', nominal },
  length: { value: metres },
  orientation: 'horizontal',
});

export const override = (change: Partial<Override>): Override => ({
  reason: 'The drawing says so',
  state: null,
  layers: null,
  finishId: null,
  vapourRetarder: null,
  codeExempt: '',
  ...change,
});

function named<Row extends { name: string }>(rows: readonly Row[], name: string): Row {
  const row = rows.find((candidate) => candidate.name === name);
  if (!row) throw new Error(`The demo has no ${name}`);
  return row;
}
