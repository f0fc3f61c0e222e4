import type { Words } from '../words';
import { saturationPressure } from './psychrometrics';
import type { LimitVerdict, WorkingInput, WorkingStep } from './study-types';
import type { Trial } from './trial';
import { amount } from './verdict';

const place = ({ input }: Trial): string => input.place.name;

const verdictWords = (verdict: LimitVerdict): string =>
  ({ met: 'met', 'not-met': 'not met', 'does-not-apply': 'does not apply', 'cannot-tell': 'cannot tell' })[
    verdict.verdict
  ];

const comparison = (
  verdict: LimitVerdict,
  kind: 'temperature' | 'heatPerLength' | 'heatFlux' | 'resistance' | 'dimension',
): Words =>
  verdict.value === null || verdict.limit === null
    ? verdict.because
    : [amount(kind, verdict.value), ' against ', amount(kind, verdict.limit)];

export const left = (
  verdict: LimitVerdict,
  kind: 'difference' | 'heatPerLength' | 'heatFlux' | 'resistance' | 'dimension',
): Words =>
  verdict.margin === null
    ? [verdictWords(verdict)]
    : [`${verdictWords(verdict)}, margin `, amount(kind, verdict.margin)];

export const touchSteps = (trial: Trial, verdict: LimitVerdict): WorkingStep[] => [
  {
    title: 'Touch',
    equation: 'T_s ≤ limit',
    filled: comparison(verdict, 'temperature'),
    result: left(verdict, 'difference'),
    inputs:
      verdict.limit === null
        ? []
        : [
            {
              symbol: 'limit',
              meaning: `touch limit of ${place(trial)}`,
              value: [amount('temperature', verdict.limit, 0)],
              source: verdict.source,
            },
          ],
    source: verdict.source,
  },
];

export function dewPointSteps(trial: Trial, verdict: LimitVerdict): WorkingStep[] {
  const { air, humidity, source } = trial.input.place.conditions.mostHumid;
  const { dewPoint, limit, value, sweatsFrom } = verdict;
  if (humidity === null || dewPoint === null || limit === null || value === null) return [];
  const pressure = (humidity / 100) * saturationPressure(air);
  const from: WorkingInput[] = [
    { symbol: 't', meaning: 'dry bulb', value: [amount('temperature', air)], source },
    { symbol: 'φ', meaning: 'relative humidity', value: [amount('humidity', humidity)], source },
    {
      symbol: 'margin',
      meaning: 'above the dew point',
      value: [amount('difference', limit - dewPoint)],
      source: 'as entered for the service',
    },
  ];
  return [
    {
      title: 'Dew point of the air',
      equation: 'p_ws(t_d) = φ p_ws(t)',
      filled: [`${humidity} % × ${saturationPressure(air).toFixed(1)} Pa = ${pressure.toFixed(1)} Pa`],
      result: [amount('temperature', dewPoint, 2)],
      inputs: from,
      source: 'Hyland and Wexler (1983), ASHRAE Handbook Fundamentals 2021 ch. 1',
    },
    {
      title: 'Dew point limit',
      equation: 'T_s ≥ t_d + margin',
      filled: comparison(verdict, 'temperature'),
      result: left(verdict, 'difference'),
      inputs: sweating(sweatsFrom),
      source: verdict.source,
    },
  ];
}

const sweating = (from: number | null): WorkingInput[] =>
  from === null
    ? []
    : [
        {
          symbol: 'φ_s',
          meaning: 'humidity at which this surface begins to sweat',
          value: [amount('humidity', from, 1)],
          source: 'p_ws(T_s) / p_ws(t)',
        },
      ];

export function heatFlowSteps(verdict: LimitVerdict): WorkingStep[] {
  const kind = verdict.unit === 'heatFlux' ? 'heatFlux' : 'heatPerLength';
  return [
    {
      title: 'Heat-flow limit',
      equation: kind === 'heatFlux' ? '|q″| ≤ limit' : '|q′| ≤ limit',
      filled: comparison(verdict, kind),
      result: left(verdict, kind),
      inputs: [],
      source: verdict.source,
    },
  ];
}

export const materialSteps = (verdict: LimitVerdict): WorkingStep[] => [
  {
    title: 'Material',
    equation: 'each interface within the use limits, each mean within the published points',
    filled: verdict.because,
    result: left(verdict, 'difference'),
    inputs: [],
    source: verdict.source,
  },
];
