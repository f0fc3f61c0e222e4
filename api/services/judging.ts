import type { JobData } from '@/api/contracts/job-data';
import type { Judgement, JudgedRun } from '@/api/contracts/judgement';
import type { Run } from '@/api/contracts/run';
import type { RunStudy } from '@/api/contracts/study';
import { EngineError } from '@/api/engine/engine-error';
import { study } from '@/api/engine/limits/study';
import type { Body, Candidate, Study, StudyInput } from '@/api/engine/limits/study-types';
import { engineVersion } from '@/api/engine/version';

import { assemble, toAssembly, type Assembled } from './assembly';
import { flagsOf } from './flagging';
import type { Judged, Solved } from './judged';
import { caseKey, studyInput } from './study-input';

/** Every run of a job, judged at what is put up; equal cases are solved once. */
export function judge(data: JobData): Judged[] {
  const cases = new Map<string, Solved>();
  return data.runs.map((run) => judgeRun(data, run, cases));
}

function judgeRun(data: JobData, run: Run, cases: Map<string, Solved>): Judged {
  const assembled = assemble(data, run);
  const solved = assembled ? solve({ data, run, assembled }, cases) : unsolved;
  const place = solved.study && assembled ? putUp(solved.study, assembled) : null;
  return { ...solved, run, assembled, used: place === null ? null : (solved.study?.candidates[place] ?? null) };
}

const unsolved: Solved = { input: null, study: null, problem: null };

/** A case that cannot be answered carries why; the others go on. */
function solve(asked: { data: JobData; run: Run; assembled: Assembled }, cases: Map<string, Solved>): Solved {
  try {
    const input = studyInput(asked.data, asked.run, asked.assembled);
    if (!input) return unsolved;
    const key = caseKey(input, asked.run.placeId);
    const solved = cases.get(key) ?? solveCase(input);
    cases.set(key, solved);
    return solved;
  } catch (error) {
    if (error instanceof EngineError) return { ...unsolved, problem: error.message };
    throw error;
  }
}

function solveCase(input: StudyInput): Solved {
  try {
    return { input, study: study(input), problem: null };
  } catch (error) {
    if (error instanceof EngineError) return { input, study: null, problem: error.message };
    throw error;
  }
}

/** The candidate that is put up: the thickness that is named, else the proposed one; null when nothing made meets all. */
export const putUp = ({ specified, proposed }: Study, { source }: Assembled): number | null =>
  source === 'proposed' ? proposed : specified;

export const judgementOf = (judged: readonly Judged[]): Judgement => ({
  runs: judged.map(toJudgedRun),
  engineVersion,
});

export function toJudgedRun(judged: Judged): JudgedRun {
  const { run, assembled, input, study: solved, used, problem } = judged;
  return {
    runId: run.id,
    assembly: assembled && problem === null ? toAssembly(assembled, used?.names ?? []) : null,
    ...(used ? upNow(used) : nothingUp),
    ...drawnAs(input),
    governing: solved?.governing ?? null,
    flags: flagsOf(judged),
    problem,
  };
}

type Up = Omit<JudgedRun, 'runId' | 'assembly' | 'body' | 'nature' | 'governing' | 'flags' | 'problem'>;

const upNow = (used: Candidate): Up => ({
  names: used.names,
  outsideDiameter: used.outsideDiameter,
  layerThicknesses: used.layerThicknesses,
  surface: surfaceOf(used),
  heatFlow: used.heat.heatFlow,
  flux: used.heat.flux,
  verdicts: used.verdicts,
});
const nothingUp: Up = {
  names: [],
  outsideDiameter: null,
  layerThicknesses: [],
  surface: null,
  heatFlow: null,
  flux: null,
  verdicts: [],
};

const drawnAs = (input: StudyInput | null): Pick<JudgedRun, 'body' | 'nature'> => ({
  body: input && bodyShape(input.body),
  nature: input?.states[0]?.nature ?? 'hot',
});

/** The surface that stands nearest its limit, else the one under mean air. */
function surfaceOf({ verdicts, heat }: Candidate): number {
  const surfaces = verdicts.flatMap(({ kind, value, margin }) =>
    (kind === 'touch' || kind === 'dew-point') && value !== null && margin !== null ? [{ value, margin }] : [],
  );
  const nearest = surfaces.toSorted((one, other) => one.margin - other.margin)[0];
  return nearest?.value ?? heat.surface;
}

/** What is drawn: the cut pipe or round duct, the cut duct, the cut wall. */
export function bodyShape(body: Body): RunStudy['body'] {
  switch (body.shape) {
    case 'pipe':
      return { shape: 'cylinder', width: body.outsideDiameter, height: body.outsideDiameter };
    case 'round-duct':
      return { shape: 'cylinder', width: body.diameter, height: body.diameter };
    case 'rectangular-duct':
      return { shape: 'rectangle', width: body.width, height: body.height };
    case 'vessel':
      return { shape: 'wall', width: body.diameter, height: body.length };
    case 'flat':
      return { shape: 'wall', width: body.height, height: body.height };
  }
}

/** A run's study as a screen needs it; null where there is none. */
export function runStudy({ run, assembled, input, study: solved, used }: Judged): RunStudy | null {
  if (!assembled || !input || !solved) return null;
  return {
    runId: run.id,
    assembly: toAssembly(assembled, used?.names ?? []),
    body: bodyShape(input.body),
    study: solved,
    used: putUp(solved, assembled),
  };
}
