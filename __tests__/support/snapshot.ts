import type { Flag, JudgedRun } from '@/api/contracts/judgement';
import type { Snapshot } from '@/api/contracts/revision';
import type { Run } from '@/api/contracts/run';
import type { ScheduleRow, TakeoffLine } from '@/api/contracts/schedule';
import type { LimitVerdict } from '@/api/contracts/study';

import { frame } from './snapshot-frame';
import { idOf, places, services } from './snapshot-parts';
import { patterns, type Pattern } from './snapshot-patterns';

const at = <Item>(list: readonly Item[], index: number): Item => {
  const item = list[index % list.length];
  if (item === undefined) throw new Error('an empty list');
  return item;
};
const kindOf = ({ shape }: Pattern) =>
  shape.kind === 'pipe' ? 'pipe' : shape.kind.endsWith('duct') ? 'duct' : 'equipment';

const numberOf = (index: number) => `R${String(index + 1).padStart(2, '0')}`;

function runOf(index: number): Run {
  const pattern = at(patterns, index);
  const status =
    index % 17 === 13 ? 'on-hold' : index % 19 === 12 ? 'by-others' : index % 11 === 7 ? 'assumed' : 'measured';
  return {
    id: idOf(1000 + index),
    version: 1,
    number: numberOf(index),
    title: index % 5 === 0 ? 'Main along grid line C' : '',
    serviceId: at(services, pattern.service).id,
    placeId: at(places, pattern.place).id,
    levelId: idOf(301 + (index % 2)),
    drawingId: idOf(401 + (index % 3)),
    shape: pattern.shape,
    elevation: { value: 3.2 },
    fittings: kindOf(pattern) === 'pipe' ? { 'elbow-90': 4, tee: 2, 'flanged-valve': 1, hanger: 12 } : {},
    status,
    hold:
      status === 'on-hold'
        ? { reason: 'Old lagging not yet tested for asbestos: do not disturb it', by: 'Idris Calloway' }
        : null,
    override:
      pattern.source === 'chosen'
        ? {
            reason: 'Legend of drawing M-12 shows 25 mm; the specification says 51 mm',
            state: null,
            layers: null,
            finishId: null,
            vapourRetarder: null,
            codeExempt: '',
          }
        : null,
    note: '',
  };
}

function verdictOf(pattern: Pattern): LimitVerdict {
  const touch = pattern.governing === 'touch';
  return {
    kind: touch ? 'touch' : 'dew-point',
    verdict: 'not-met',
    because: touch ? ['the surface is above the limit'] : ['dry, but by less than the margin'],
    value: touch ? 63.1 : 21.4,
    limit: touch ? 60 : 21.9,
    margin: touch ? -3.1 : -0.5,
    unit: 'temperature',
    state: touch ? null : 'marginal',
    dewPoint: touch ? null : 20.9,
    sweatsFrom: touch ? null : 87,
    judgedAt: null,
    source: 'Project figure',
  };
}

function flagsOf(index: number): Flag[] {
  const pattern = at(patterns, index);
  const run = runOf(index);
  const hold: Flag[] = run.hold
    ? [{ runId: run.id, kind: 'hold', verdict: null, meetsBy: null, words: ['On hold: ', run.hold.reason, '.'] }]
    : [];
  if (index % 10 === 1) {
    const words: Flag['words'] = [
      { thickness: ['in:1'] },
      ' is not enough: the surface would reach ',
      { kind: 'temperature', value: 63.1 },
      '; the limit is ',
      { kind: 'temperature', value: 60 },
      '.',
    ];
    return [
      {
        runId: run.id,
        kind: 'touch',
        verdict: verdictOf(pattern),
        meetsBy: { thickness: 'in:1.5', margin: 2.4 },
        words,
      },
      ...hold,
    ];
  }
  if (index % 10 !== 7) return hold;
  const words: Flag['words'] = [
    'Dry, but by less than the margin of ',
    { kind: 'difference', value: 1 },
    '; it sweats from ',
    { kind: 'humidity', value: 87 },
    ' on.',
  ];
  return [{ runId: run.id, kind: 'dew-point', verdict: verdictOf(pattern), meetsBy: null, words }, ...hold];
}

function judgedOf(index: number): JudgedRun {
  const pattern = at(patterns, index);
  return {
    runId: idOf(1000 + index),
    assembly: {
      source: pattern.source,
      specificationLabel: 'P07',
      reason: pattern.source === 'chosen' ? 'Legend of drawing M-12 shows 25 mm; the specification says 51 mm' : '',
      layers: pattern.names.map((thickness) => ({
        materialId: pattern.material[0],
        materialName: pattern.material[1],
        thickness,
      })),
      finishId: 'std/pvc-jacket',
      finishName: pattern.finish,
      vapourRetarder: pattern.retarder,
      codeExempt: '',
    },
    names: pattern.names,
    outsideDiameter: null,
    layerThicknesses: pattern.section.layers.map(({ thickness }) => thickness),
    body: { shape: pattern.section.shape, width: pattern.section.width, height: pattern.section.height },
    nature: pattern.section.nature,
    surface: 41.3,
    heatFlow: 17.2,
    flux: 30.1,
    governing: pattern.governing,
    verdicts: [],
    flags: flagsOf(index),
    problem: null,
  };
}

const ofPattern = (pattern: Pattern, count: number) =>
  Array.from({ length: count }, (_, index) => index).filter((index) => at(patterns, index) === pattern);

function rowOf(pattern: Pattern, count: number): ScheduleRow {
  const runs = ofPattern(pattern, count);
  const service = at(services, pattern.service);
  return {
    key: `${service.name} ${pattern.size}`,
    serviceId: service.id,
    service: service.name,
    appliesTo: kindOf(pattern),
    operating: service.states.map(({ operating }) => operating.value),
    sizes: [pattern.size],
    places: [at(places, pattern.place).name],
    layers: pattern.names.map((thickness) => ({ material: pattern.material[1], thickness })),
    finish: pattern.finish,
    vapourRetarder: pattern.retarder,
    source: pattern.source,
    specificationLabel: pattern.source === 'proposed' ? null : 'P07',
    reasons: pattern.source === 'chosen' ? ['Legend of drawing M-12 shows 25 mm'] : [],
    governing: pattern.governing,
    decides: [pattern.decides],
    runIds: runs.map((index) => idOf(1000 + index)),
    runNumbers: runs.map(numberOf),
    flags: runs.flatMap(flagsOf).length,
    section: pattern.section,
  };
}

const lengthOf = ({ shape }: Pattern) => ('length' in shape && shape.kind !== 'vessel' ? shape.length.value : null);
const areaOf = (pattern: Pattern) =>
  kindOf(pattern) === 'duct' ? 2.3047 * (lengthOf(pattern) ?? 0) : kindOf(pattern) === 'equipment' ? 9.1263 : null;

function lineOf(pattern: Pattern, count: number): TakeoffLine {
  const runs = ofPattern(pattern, count);
  const times = (value: number | null) => (value === null ? null : value * runs.length);
  const fittings = Object.entries(runOf(patterns.indexOf(pattern)).fittings);
  return {
    key: `${pattern.size} ${pattern.finish}`,
    appliesTo: kindOf(pattern),
    service: at(services, pattern.service).name,
    size: pattern.size,
    material: pattern.material[1],
    names: pattern.names,
    finish: pattern.finish,
    length: times(lengthOf(pattern)),
    area: times(areaOf(pattern)),
    count: pattern.shape.kind === 'vessel' ? pattern.shape.count * runs.length : null,
    fittings: fittings.flatMap(([kind, each]) => (isKind(kind) ? [{ kind, count: each * runs.length }] : [])),
    runIds: runs.map((index) => idOf(1000 + index)),
    runNumbers: runs.map(numberOf),
  };
}
const counted = ['elbow-90', 'tee', 'flanged-valve', 'hanger'] as const;
const isKind = (kind: string): kind is (typeof counted)[number] => counted.some((each) => each === kind);

function totalFittings(lines: TakeoffLine[]): TakeoffLine['fittings'] {
  const countOf = (kind: string) =>
    lines.flatMap(({ fittings }) => fittings).reduce((sum, each) => sum + (each.kind === kind ? each.count : 0), 0);
  return counted.map((kind) => ({ kind, count: countOf(kind) })).filter(({ count }) => count > 0);
}

/** A frozen takeoff of an invented job with so many runs. */
export function sampleSnapshot(count = 24): Snapshot {
  const indexes = Array.from({ length: count }, (_, index) => index);
  const used = patterns.filter((pattern) => ofPattern(pattern, count).length > 0);
  const lines = used.map((pattern) => lineOf(pattern, count));
  const runs = indexes.map(runOf);
  const numbersOf = (status: Run['status']) => runs.filter((run) => run.status === status).map(({ number }) => number);
  return {
    ...frame,
    runs,
    judged: indexes.map(judgedOf),
    flags: indexes.flatMap(flagsOf),
    schedule: { rows: used.map((pattern) => rowOf(pattern, count)) },
    takeoff: { lines, fittings: totalFittings(lines), byOthers: numbersOf('by-others'), onHold: numbersOf('on-hold') },
  };
}
