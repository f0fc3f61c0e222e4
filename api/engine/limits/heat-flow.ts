import type { FluidState, LimitInput, LimitVerdict } from './study-types';
import { heatPerLength, type Trial } from './trial';
import { amount, cannotTell, judged, worst } from './verdict';

type HeatFlowLimit = Extract<LimitInput, { kind: 'heat-flow' }>;

/**
 * Heat flow: at most the limit, at operating temperature, hot service in the coldest air and cold service in the
 * warmest, each with its wind, emittance aged. Gain counts as loss does. Of two states or two limits the worse counts.
 *
 * @returns value, limit and margin [W/m or W/m²]
 * @source the limit is the project's
 */
export function judgeHeatFlow(trial: Trial, limit: HeatFlowLimit): LimitVerdict {
  const verdicts = trial.input.states.flatMap((state) => judgeState(trial, limit, state));
  const [first, ...others] = verdicts;
  if (!first) return cannotTell('heat-flow', ['no value is entered for this limit']);
  return worst([first, ...others]);
}

function judgeState(trial: Trial, { perLength, flux }: HeatFlowLimit, state: FluidState): LimitVerdict[] {
  const set = state.nature === 'hot' ? 'coldest' : 'warmest';
  const { result, judgedAt } = trial.solve({ fluid: state.operating, set, emittance: 'aged' });
  const along = heatPerLength(trial.input.body, trial.build, result);
  const compare = (value: number, limit: number, unit: 'heatPerLength' | 'heatFlux') =>
    judged('heat-flow', {
      isMet: value <= limit,
      because: [
        state.nature === 'hot' ? 'it loses ' : 'it takes up ',
        amount(unit, value),
        '; the limit is ',
        amount(unit, limit),
      ],
      value,
      limit,
      margin: limit - value,
      unit,
      judgedAt,
      source: 'limit as entered for the service',
    });
  return [
    ...(flux === null ? [] : [compare(Math.abs(result.heatFluxDensity), flux, 'heatFlux')]),
    ...(perLength === null ? [] : [along === null ? noLength() : compare(Math.abs(along), perLength, 'heatPerLength')]),
  ];
}

const noLength = (): LimitVerdict =>
  cannotTell('heat-flow', ['the limit is per metre, and a flat surface has no length to count by']);
