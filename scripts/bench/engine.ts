import { performance } from 'node:perf_hooks';

import type { HeatCase } from '@/api/engine/heat/heat-case';
import { solve } from '@/api/engine/heat/solve';
import type { CurvePoint } from '@/api/engine/standards/rows';

import { medianTime } from './median';

const curve: readonly CurvePoint[] = [
  [-4, 0.034],
  [24, 0.035],
  [93, 0.043],
  [204, 0.061],
];
const cases = 20_000;

/** Solves in a second: horizontal pipes with a four-point curve, every other one in wind, no two alike. */
export function benchEngine() {
  return { solvesPerSecond: perSecond(1), solvesPerSecondThreeLayers: perSecond(3) };
}

function perSecond(layers: number): number {
  const made = Array.from({ length: cases }, (_, place) => caseAt(place, layers));
  const warmUntil = performance.now() + 500;
  while (performance.now() < warmUntil) made.slice(0, 2000).forEach(solve);
  return Math.round(cases / (medianTime(15, () => made.forEach(solve)) / 1000));
}

function caseAt(place: number, layers: number): HeatCase {
  const whole = 0.025 + 0.0005 * (place % 151);
  return {
    shape: 'horizontal-cylinder',
    outsideDiameter: 0.0213 + 0.00001 * place,
    layers: Array.from({ length: layers }, () => ({ thickness: whole / layers, conductivity: curve })),
    operatingTemperature: 5 + (place % 180),
    airTemperature: 15 + (place % 23),
    emittance: 0.05 + 0.01 * (place % 90),
    windSpeed: place % 2 === 0 ? 0 : 0.5 + (place % 8),
    surface: 'astm-c680',
  };
}
