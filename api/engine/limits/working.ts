import { EngineError } from '../engine-error';
import { engineVersion } from '../version';
import type { Words } from '../words';
import { buildsOf } from './candidates';
import { checkInput } from './check-input';
import { judge } from './study';
import type { LimitKind, LimitVerdict, StudyInput, Working, WorkingStep } from './study-types';
import { type Asked, type Solved, setWords, type Trial, trialOf } from './trial';
import { codeSteps } from './working-code';
import { conductionSteps, surfaceSteps } from './working-heat';
import { dewPointSteps, heatFlowSteps, materialSteps, touchSteps } from './working-limits';

/** Which number is opened: the heat shown, the surface under it, or what a limit was judged by. */
export type WorkingAsked = { candidate: number; about: 'heat-flow' | 'surface' | LimitKind };

/**
 * The working of one number of a study: its equations in the order in which they are solved, with the values put in,
 * where each value comes from, and what follows. A heat-flow limit and the heat shown are told apart by whether the
 * study has that limit.
 *
 * @throws EngineError when the study has no such candidate or no such limit
 * @source each step names its own
 */
export function working(input: StudyInput, { candidate, about }: WorkingAsked): Working {
  checkInput(input);
  const build = buildsOf(input).builds[candidate];
  if (!build) throw new EngineError(`The study has no candidate ${candidate}`, 'candidate');
  const trial = trialOf(input, build);
  const limit = input.limits.find(({ kind }) => kind === about);
  if (about === 'surface' || (about === 'heat-flow' && !limit)) return heatWorking(trial, about);
  if (!limit) throw new EngineError(`The study has no limit ${about}`, 'about');
  return limitWorking(trial, judge(trial, limit));
}

const shown = (trial: Trial): Asked => ({
  fluid: trial.input.states[0]?.operating ?? NaN,
  set: 'mean',
  emittance: 'aged',
});

function heatWorking(trial: Trial, about: 'heat-flow' | 'surface'): Working {
  const solved = trial.solve(shown(trial));
  const steps = [...conductionSteps(trial, solved), ...surfaceSteps(trial, solved)];
  const title = about === 'surface' ? 'Surface temperature' : 'Heat flow';
  return finished(`${title}, operating, ${setWords.mean}`, steps, notesOf(trial, solved));
}

const titles: Record<LimitKind, string> = {
  touch: 'Touch',
  'dew-point': 'Dew point',
  'energy-code': 'Energy code',
  'heat-flow': 'Heat-flow limit',
  material: 'Material',
};

function limitWorking(trial: Trial, verdict: LimitVerdict): Working {
  const solved = verdict.judgedAt ? solvedAgain(trial, verdict) : undefined;
  const heat = solved ? [...conductionSteps(trial, solved), ...surfaceSteps(trial, solved)] : [];
  const steps = [...heat, ...ownSteps(trial, verdict)];
  return finished(
    titles[verdict.kind],
    steps.length > 0 ? steps : [plainStep(verdict)],
    solved ? notesOf(trial, solved) : [],
  );
}

/** The case that the verdict was judged at; the trial has it already. */
function solvedAgain(trial: Trial, { judgedAt }: LimitVerdict): Solved | undefined {
  if (!judgedAt) return undefined;
  const { set, fluid, wind } = judgedAt;
  const isStill = wind !== trial.input.place.conditions[set].wind;
  const asked = (emittance: Asked['emittance']) => trial.solve({ fluid, set, emittance, isStill });
  const [fresh, aged] = [asked('new'), asked('aged')];
  return fresh.judgedAt.emittance === judgedAt.emittance ? fresh : aged;
}

function ownSteps(trial: Trial, verdict: LimitVerdict): WorkingStep[] {
  if (verdict.verdict === 'does-not-apply') return [];
  switch (verdict.kind) {
    case 'touch':
      return touchSteps(trial, verdict);
    case 'dew-point':
      return dewPointSteps(trial, verdict);
    case 'heat-flow':
      return heatFlowSteps(verdict);
    case 'energy-code':
      return codeSteps(trial, verdict);
    case 'material':
      return materialSteps(verdict);
  }
}

const verdictWords = {
  met: 'met',
  'not-met': 'not met',
  'does-not-apply': 'does not apply',
  'cannot-tell': 'cannot tell',
} as const;

function plainStep({ kind, verdict, because, source }: LimitVerdict): WorkingStep {
  const result: Words = [verdictWords[verdict]];
  return { title: titles[kind], equation: '', filled: because, result, inputs: [], source };
}

const notesOf = (trial: Trial, { result }: Solved): string[] => [...trial.build.notes, ...result.notes];

const finished = (title: string, steps: WorkingStep[], notes: string[]): Working => ({
  title,
  steps,
  notes,
  engineVersion,
});
