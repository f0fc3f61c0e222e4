import { engineVersion } from '../version';
import type { Build } from './build';
import { buildsOf } from './candidates';
import { checkInput } from './check-input';
import { choose, meetsAll } from './choosing';
import { judgeDewPoint } from './dew-point';
import { judgeEnergyCode } from './energy-code';
import { judgeHeatFlow } from './heat-flow';
import { judgeMaterial } from './material';
import { plasticNote, plasticWall } from './plastic-wall';
import { sentenceOf, whyNotThinnerOf } from './sentences';
import type { Candidate, Conditions, LimitInput, LimitVerdict, Study, StudyInput } from './study-types';
import { judgeTouch } from './touch';
import { heatAnswer, type Trial, trialOf } from './trial';

/**
 * A thickness study: bare and every made thickness of the outermost layer, each with its heat flow at operating
 * temperature in mean air with the emittance aged, and judged by every limit under that limit's own conditions. The
 * thinnest made that meets all is proposed; a specified thickness is judged the same way.
 *
 * @throws EngineError naming the place, the air and the field for a case that cannot be solved
 * @source each verdict names the source of its limit; see `heat/solve` for heat and temperatures
 */
export function study(input: StudyInput): Study {
  checkInput(input);
  const { builds, specified } = buildsOf(input);
  const candidates = builds.map((build) => candidateOf(input, build));
  const picked = choose(candidates, input.limits);
  const told = { candidates, specified, ...picked };
  return {
    ...told,
    sentence: sentenceOf(told),
    whyNotThinner: whyNotThinnerOf(told),
    engineVersion,
    method: input.method,
    notes: studyNotes(input),
  };
}

/** One thickness judged: what a study has many of. */
export function candidateOf(input: StudyInput, build: Build): Candidate {
  const trial = trialOf(input, build);
  const operating = input.states[0]?.operating ?? NaN;
  const heat = heatAnswer(trial, trial.solve({ fluid: operating, set: 'mean', emittance: 'aged' }));
  const verdicts = input.limits.map((limit) => judge(trial, limit));
  return {
    name: build.name,
    names: build.names,
    outsideDiameter: build.outsideDiameter,
    layerThicknesses: build.thicknesses,
    basis: build.basis,
    heat,
    verdicts,
    meetsAll: meetsAll(verdicts),
    notes: [...build.notes, ...layerNotes(build), ...wallNotes(input)],
  };
}

/** One build under one limit. */
export function judge(trial: Trial, limit: LimitInput): LimitVerdict {
  switch (limit.kind) {
    case 'touch':
      return judgeTouch(trial);
    case 'dew-point':
      return judgeDewPoint(trial, limit.margin);
    case 'energy-code':
      return judgeEnergyCode(trial);
    case 'heat-flow':
      return judgeHeatFlow(trial, limit);
    case 'material':
      return judgeMaterial(trial);
  }
}

const usualLayer = 0.0762; // m; thicker is usually put up in two layers, common practice, no source

const layerNotes = ({ names, thicknesses }: Build): string[] =>
  names.length === 1 && (thicknesses[0] ?? 0) > usualLayer + 0.01 ? ['Usually put up in two layers.'] : [];

function wallNotes({ body }: StudyInput): string[] {
  const wall = plasticWall(body);
  return wall ? [plasticNote(wall)] : [];
}

function studyNotes({ place, limits, states, method, body, codeExempt }: StudyInput): string[] {
  const has = (kind: LimitInput['kind']) => limits.some((limit) => limit.kind === kind);
  const isCold = states.some(({ nature }) => nature === 'cold');
  return [
    ...(place.outdoor && (has('touch') || has('dew-point')) ? ['Sun and the clear night sky are not counted.'] : []),
    ...(isCold && has('energy-code') && codeExempt === null
      ? ['The energy code counts energy only: it promises no dry surface.']
      : []),
    ...(method === 'iso-12241' && hasWind(place.conditions)
      ? [
          'Surface by ISO 12241: its wind formula for pipes gives about twice the coefficient of the ASTM C680 practice.',
        ]
      : []),
    ...(body.shape === 'rectangular-duct' ? ['The duct is judged at its vertical side.'] : []),
  ];
}

const hasWind = (conditions: Record<string, Conditions>): boolean =>
  Object.values(conditions).some(({ wind }) => wind > 0);
