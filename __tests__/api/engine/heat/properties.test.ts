import { assert, constantFrom, double, property, record } from 'fast-check';

import type { HeatCase, HeatShape } from '@/api/engine/heat/heat-case';
import { solve } from '@/api/engine/heat/solve';
import type { CurvePoint } from '@/api/engine/standards/rows';

const number = (min: number, max: number) => double({ min, max, noNaN: true });
const mineral: readonly CurvePoint[] = [
  [-4, 0.034],
  [24, 0.035],
  [93, 0.043],
  [204, 0.061],
];
const shapes: readonly HeatShape[] = [
  'horizontal-cylinder',
  'vertical-cylinder',
  'vertical-flat',
  'horizontal-flat-up',
  'horizontal-flat-down',
];
const anyCase = record({
  shape: constantFrom(...shapes),
  outsideDiameter: number(0.01, 1),
  height: number(0.2, 5),
  characteristicLength: number(0.1, 2),
  windLength: number(0.2, 4),
  operatingTemperature: number(-60, 350),
  airTemperature: number(-30, 45),
  emittance: number(0.03, 1),
  windSpeed: number(0, 12),
  altitude: number(0, 3000),
  surface: constantFrom('astm-c680' as const, 'iso-12241' as const),
});
const thick = number(0.005, 0.2);
const insulated = (heatCase: Omit<HeatCase, 'layers'>, ...thicknesses: number[]): HeatCase => ({
  ...heatCase,
  layers: thicknesses.map((thickness) => ({ thickness, conductivity: mineral })),
});

it('closes: conducted is given off, and the surface lies between pipe and air', () => {
  assert(
    property(anyCase, thick, (heatCase, thickness) => {
      const result = solve(insulated(heatCase, thickness));
      const { operatingTemperature, airTemperature } = heatCase;
      expect(Math.abs(result.closure)).toBeLessThan(1e-9);
      expect(result.surfaceTemperature).toBeGreaterThanOrEqual(Math.min(operatingTemperature, airTemperature));
      expect(result.surfaceTemperature).toBeLessThanOrEqual(Math.max(operatingTemperature, airTemperature));
    }),
    { numRuns: 500 },
  );
});

it('carries heat from warm to cold, and none between equals', () => {
  assert(
    property(anyCase, thick, (heatCase, thickness) => {
      const { operatingTemperature, airTemperature } = heatCase;
      const { heatFlow } = solve(insulated(heatCase, thickness));
      if (Math.abs(operatingTemperature - airTemperature) > 1e-6) {
        expect(Math.sign(heatFlow)).toBe(Math.sign(operatingTemperature - airTemperature));
      }
      const equal = solve(insulated({ ...heatCase, operatingTemperature: airTemperature }, thickness));
      expect([equal.heatFlow, equal.heatFluxDensity, equal.surfaceTemperature]).toEqual([0, 0, airTemperature + 0]);
    }),
  );
});

it('conserves heat from layer to layer: flux times area is the same at pipe and jacket', () => {
  assert(
    property(anyCase, thick, thick, (heatCase, one, other) => {
      const result = solve(insulated(heatCase, one, other));
      const isFlat = heatCase.shape.includes('flat');
      const ratio = isFlat ? 1 : (heatCase.outsideDiameter + 2 * (one + other)) / heatCase.outsideDiameter;
      expect(result.heatFluxDensityAtPipe).toBeCloseTo(result.heatFluxDensity * ratio, 6);
    }),
  );
});

it('two layers of one material are one thick layer', () => {
  assert(
    property(anyCase, thick, thick, (heatCase, one, other) => {
      const [split, whole] = [solve(insulated(heatCase, one, other)), solve(insulated(heatCase, one + other))];
      expect(split.surfaceTemperature).toBeCloseTo(whole.surfaceTemperature, 5);
      expect(split.heatFlow / (whole.heatFlow || 1)).toBeCloseTo(whole.heatFlow === 0 ? 0 : 1, 6);
    }),
  );
});

it('more insulation never loses more on a flat', () => {
  const flat = anyCase.map((heatCase) => ({ ...heatCase, shape: 'vertical-flat' as const }));
  assert(
    property(flat, thick, thick, (heatCase, one, more) => {
      const [thin, thicker] = [solve(insulated(heatCase, one)), solve(insulated(heatCase, one + more))];
      expect(Math.abs(thicker.heatFlow)).toBeLessThanOrEqual(Math.abs(thin.heatFlow) * (1 + 1e-9));
    }),
  );
});

it('on a small bore the first insulation can lose more than none: the critical radius is seen', () => {
  const wire = {
    shape: 'horizontal-cylinder',
    outsideDiameter: 0.003,
    operatingTemperature: 80,
    airTemperature: 20,
    emittance: 0.9,
    surface: 'astm-c680',
  } as const;
  const plastic = (thickness: number) => ({ ...wire, layers: [{ thickness, conductivity: [[20, 0.2]] as const }] });
  expect(solve(plastic(0.002)).heatFlow).toBeGreaterThan(solve({ ...wire, layers: [] }).heatFlow);
});

it('loses more with more conductivity', () => {
  assert(
    property(anyCase, thick, number(0.02, 0.1), (heatCase, thickness, conductivity) => {
      const flow = (k: number) =>
        Math.abs(solve({ ...heatCase, layers: [{ thickness, conductivity: [[0, k]] }] }).heatFlow);
      expect(flow(conductivity * 1.1)).toBeGreaterThanOrEqual(flow(conductivity) * (1 - 1e-9));
    }),
  );
});

it('loses more with more emittance', () => {
  assert(
    property(anyCase, thick, (heatCase, thickness) => {
      const flow = (emittance: number) => Math.abs(solve(insulated({ ...heatCase, emittance }, thickness)).heatFlow);
      expect(flow(Math.min(1, heatCase.emittance * 1.3))).toBeGreaterThanOrEqual(flow(heatCase.emittance) * (1 - 1e-9));
    }),
  );
});

it('loses more with more wind, by the C680 practice', () => {
  const pipes = anyCase.map((heatCase) => ({
    ...heatCase,
    shape: 'horizontal-cylinder' as const,
    surface: 'astm-c680' as const,
  }));
  assert(
    property(pipes, thick, number(0.1, 5), (heatCase, thickness, more) => {
      const flow = (windSpeed: number) => Math.abs(solve(insulated({ ...heatCase, windSpeed }, thickness)).heatFlow);
      expect(flow(heatCase.windSpeed + more)).toBeGreaterThanOrEqual(flow(heatCase.windSpeed) * (1 - 1e-9));
    }),
  );
});

it('is symmetric in sign with a given coefficient, one conductivity and equal lengths', () => {
  assert(
    property(thick, number(1, 200), number(1, 50), (thickness, difference, coefficient) => {
      const flow = (operatingTemperature: number) =>
        solve({
          shape: 'horizontal-cylinder',
          outsideDiameter: 0.1,
          layers: [{ thickness, conductivity: [[0, 0.04]] }],
          operatingTemperature,
          airTemperature: 20,
          surface: { coefficient },
        }).heatFlow;
      expect(flow(20 + difference)).toBeCloseTo(-flow(20 - difference), 6);
    }),
  );
});

it('finds the surface between all three temperatures when the surroundings have their own', () => {
  assert(
    property(anyCase, thick, number(-50, 80), (heatCase, thickness, surroundingsTemperature) => {
      const result = solve(insulated({ ...heatCase, surroundingsTemperature }, thickness));
      const all = [heatCase.operatingTemperature, heatCase.airTemperature, surroundingsTemperature];
      expect(result.surfaceTemperature).toBeGreaterThanOrEqual(Math.min(...all) - 1e-9);
      expect(result.surfaceTemperature).toBeLessThanOrEqual(Math.max(...all) + 1e-9);
    }),
    { numRuns: 300 },
  );
});
