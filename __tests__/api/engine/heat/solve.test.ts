import { EngineError } from '@/api/engine/engine-error';
import { airAt } from '@/api/engine/heat/air';
import { nusseltCrossFlow, nusseltPlate } from '@/api/engine/heat/forced-convection';
import type { HeatCase } from '@/api/engine/heat/heat-case';
import { solve } from '@/api/engine/heat/solve';

const pipe: HeatCase = {
  shape: 'horizontal-cylinder',
  outsideDiameter: 0.0603,
  layers: [
    {
      thickness: 0.0508,
      conductivity: [
        [0, 0.034],
        [100, 0.043],
      ],
    },
  ],
  operatingTemperature: 80,
  airTemperature: 20,
  emittance: 0.9,
  surface: 'astm-c680',
};

it('gives interfaces from the pipe outwards, and what the numbers mean together', () => {
  const result = solve(pipe);
  const [inner, outer] = result.interfaceTemperatures;
  expect([inner, outer]).toEqual([80, result.surfaceTemperature]);
  const [mean = NaN] = result.meanConductivities;
  const conducted = (2 * Math.PI * mean * (80 - result.surfaceTemperature)) / Math.log(0.1619 / 0.0603);
  expect(conducted).toBeCloseTo(result.heatFlow, 9);
  expect(result.heatFlow / (Math.PI * 0.1619)).toBeCloseTo(result.heatFluxDensity, 9);
  expect(result.surfaceCoefficient * (result.surfaceTemperature - 20)).toBeCloseTo(result.heatFluxDensity, 7);
  expect((result.convectiveCoefficient ?? NaN) + (result.radiativeCoefficient ?? NaN)).toBe(result.surfaceCoefficient);
});

it('solves a bare pipe without steps', () => {
  const result = solve({ ...pipe, layers: [] });
  expect(result).toMatchObject({ interfaceTemperatures: [80], surfaceTemperature: 80, iterations: 0, closure: 0 });
});

it('says when a curve is continued beyond its points', () => {
  expect(solve({ ...pipe, operatingTemperature: 150 }).notes.join()).toContain('outside the published points');
  expect(solve(pipe).notes).toEqual([]);
});

it('counts altitude: thinner air takes less', () => {
  expect(solve({ ...pipe, altitude: 3000 }).surfaceTemperature).toBeGreaterThan(solve(pipe).surfaceTemperature);
});

describe('where a correlation jumps', () => {
  // ISO 12241 steps from laminar to turbulent at H³ΔT = 10 m³K: on a wall 2 m high at 1.25 K above the air
  const wall: HeatCase = { ...pipe, shape: 'vertical-flat', height: 2, surface: 'iso-12241', airTemperature: 20 };
  const jumping = Array.from({ length: 60 }, (_, place) => solve({ ...wall, operatingTemperature: 30 + place }));
  const atJump = jumping.filter(({ notes }) => notes.some((note) => note.includes('jumps')));

  it('puts the surface at the jump, with what is conducted there and the effective coefficient', () => {
    expect(atJump.length).toBeGreaterThan(0);
    for (const result of atJump) {
      expect(result.surfaceTemperature).toBeCloseTo(21.25, 6);
      expect(result.closure).toBe(0);
      expect(result.surfaceCoefficient * 1.25).toBeCloseTo(result.heatFluxDensity, 6);
    }
  });

  it('grows with the fluid across it, without a gap', () => {
    const flows = jumping.map(({ heatFlow }) => heatFlow);
    expect([...flows].sort((one, other) => one - other)).toEqual(flows);
  });
});

describe('ISO 12241', () => {
  const iso: HeatCase = { ...pipe, surface: 'iso-12241', outsideDiameter: 0.1, layers: [] };
  const convective = (change: Partial<HeatCase>) => solve({ ...iso, ...change }).convectiveCoefficient;
  // formulas of ISO 12241 from memory; values by hand
  it('free: 1.25 (ΔT/D)^¼ up to D³ΔT = 10', () => expect(convective({})).toBeCloseTo(1.25 * (60 / 0.1) ** 0.25, 9));
  it('free: 1.21 ΔT^⅓ above', () => expect(convective({ outsideDiameter: 1 })).toBeCloseTo(1.21 * 60 ** (1 / 3), 9));
  it('wind: 8.9 v^0.9 / D^0.1', () =>
    expect(convective({ windSpeed: 5 })).toBeCloseTo((8.9 * 5 ** 0.9) / 0.1 ** 0.1, 9));
  it('wind never gives less than still air', () => expect(convective({ windSpeed: 0.05 })).toBe(convective({})));
  it('walls: 5.76 (v⁴/H)^⅕', () =>
    expect(convective({ shape: 'vertical-flat', height: 3, windSpeed: 6 })).toBeCloseTo(5.76 * (6 ** 4 / 3) ** 0.2, 9));
  it('does not count altitude, and says so', () =>
    expect(solve({ ...iso, altitude: 500 }).notes.join()).toContain('altitude is not counted'));
});

describe('the C680 practice combines coefficients, not Nusselt numbers', () => {
  const bare: HeatCase = { ...pipe, layers: [], height: 2, characteristicLength: 0.5, windLength: 3 };
  const air = airAt(273.15 + 50, 1);
  const alongPlate = (length: number) =>
    (nusseltPlate((1.5 * length) / air.viscosity, air.prandtl) * air.conductivity) / length;
  const across = (nusseltCrossFlow((1.5 * 0.0603) / air.viscosity, air.prandtl) * air.conductivity) / 0.0603;
  it.each([
    ['horizontal-cylinder', 4, across],
    ['vertical-cylinder', 3, across],
    ['vertical-flat', 3, alongPlate(2)],
    ['horizontal-flat-up', 3.5, alongPlate(3)],
  ] as const)('%s: n = %p, forced on its own length', (shape, power, forced) => {
    const natural = solve({ ...bare, shape }).convectiveCoefficient ?? NaN;
    const both = solve({ ...bare, shape, windSpeed: 1.5 }).convectiveCoefficient ?? NaN;
    expect(both ** power).toBeCloseTo(natural ** power + forced ** power, 6);
  });

  it('has the vertical pipe natural on its height, forced on its diameter', () => {
    const tall = (height: number) => solve({ ...bare, shape: 'vertical-cylinder', height }).convectiveCoefficient;
    expect(tall(2)).not.toBe(tall(3));
    expect(tall(2)).toBe(solve({ ...bare, shape: 'vertical-flat', height: 2 }).convectiveCoefficient);
  });

  it('has air driven away from a plate facing up when hot and from one facing down when cold', () => {
    const plate = (shape: HeatCase['shape'], operatingTemperature: number) =>
      solve({ ...bare, shape, operatingTemperature, airTemperature: 20 }).convectiveCoefficient ?? NaN;
    expect(plate('horizontal-flat-up', 50)).toBeGreaterThan(plate('horizontal-flat-down', 50));
    expect(plate('horizontal-flat-down', 5)).toBeGreaterThan(plate('horizontal-flat-up', 5));
  });
});

const wrong: [string, Partial<HeatCase> | Record<string, unknown>][] = [
  ['operatingTemperature', { operatingTemperature: NaN }],
  ['operatingTemperature', { operatingTemperature: -300 }],
  ['airTemperature', { airTemperature: 3727 }],
  ['airTemperature', { airTemperature: undefined }],
  ['emittance', { emittance: 0 }],
  ['emittance', { emittance: 1.01 }],
  ['emittance', { emittance: undefined }],
  ['outsideDiameter', { outsideDiameter: 0 }],
  ['outsideDiameter', { outsideDiameter: undefined }],
  ['height', { shape: 'vertical-flat' }],
  ['characteristicLength', { shape: 'horizontal-flat-up' }],
  ['windLength', { shape: 'horizontal-flat-up', characteristicLength: 0.5, windSpeed: 2 }],
  ['windSpeed', { windSpeed: -1 }],
  ['altitude', { altitude: 20_000 }],
  ['surroundingsTemperature', { surroundingsTemperature: Infinity }],
  ['layers[0].thickness', { layers: [{ thickness: 5, conductivity: [[0, 0.04]] }] }],
  ['layers[0].thickness', { layers: [{ thickness: 0, conductivity: [[0, 0.04]] }] }],
  ['layers[0].conductivity', { layers: [{ thickness: 0.05, conductivity: [] }] }],
  ['layers[0].conductivity', { layers: [{ thickness: 0.05, conductivity: [[0, -0.04]] }] }],
  [
    'layers[0].conductivity',
    {
      layers: [
        {
          thickness: 0.05,
          conductivity: [
            [10, 0.04],
            [10, 0.05],
          ],
        },
      ],
    },
  ],
  ['surface', { surface: 'own' }],
  ['surface.coefficient', { surface: { coefficient: 0 } }],
  ['shape', { shape: 'sphere' }],
];
it.each(wrong)('refuses by field: %s', (field, change) => {
  const heatCase = Object.assign({ ...pipe }, change);
  const attempt = () => solve(heatCase);
  expect(attempt).toThrow(EngineError);
  expect(attempt).toThrow(expect.objectContaining({ field }));
});

it('needs no emittance where the coefficient is given', () => {
  const result = solve({ ...pipe, emittance: undefined, surface: { coefficient: 9 } });
  expect(result).toMatchObject({ surfaceCoefficient: 9, convectiveCoefficient: null, radiativeCoefficient: null });
});
