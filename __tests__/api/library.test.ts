import { z } from 'zod';

import {
  libraryCodeSchema,
  libraryFinishSchema,
  libraryMaterialSchema,
  libraryPipeSizeSchema,
  librarySafetySchema,
  librarySeriesSchema,
} from '@/api/contracts/library';

import { newFirm, newMember, signedIn } from '../support/firm';
import type { Agent } from '../support/job';
import { startStack, type Stack } from '../support/stack';

let stack: Stack;
let agent: Agent;
beforeAll(async () => {
  stack = await startStack();
  const owner = await newFirm(stack.services);
  agent = await signedIn(stack, await newMember(stack.services, owner, { role: 'foreman' }));
});
afterAll(() => stack.stop());

async function read<Part>(part: string, schema: z.ZodType<Part>): Promise<Part> {
  const { body } = await agent.get(`/api/library/${part}`).expect(200);
  const parsed = schema.parse(body);
  // the contract knows all that is sent
  expect(parsed).toEqual(body);
  return parsed;
}
const isFilled = (row: { source: string; confidence: string }) => row.source !== '' && row.confidence !== '';

it('has pipes and tubes by standard and nominal', async () => {
  const sizes = await read('pipe-sizes', z.array(libraryPipeSizeSchema));
  const find = (standard: string, nominal: string) =>
    sizes.find((size) => size.standard === standard && size.nominal === nominal);
  // DN 50: 2.375 in, ASME B36.10M; 2 in tube: nominal + 1/8 in, ASTM B88
  expect(find('asme-steel', 'NPS 2')).toMatchObject({ dn: 50, outsideDiameter: 0.0603 });
  expect(find('astm-copper', '2 in')?.outsideDiameter).toBeCloseTo(2.125 * 0.0254, 4);
  // DN 65 is 73.0 mm (ASME B36.10M) or 76.1 mm (EN 10255)
  expect(find('asme-steel', 'NPS 2-1/2')).toMatchObject({ dn: 65, outsideDiameter: 0.073 });
  expect(find('en-10255', 'DN 65')).toMatchObject({ dn: 65, outsideDiameter: 0.0761 });
  expect(sizes.filter((size) => !isFilled(size))).toEqual([]);
});

it('has materials with the curve that is used and those to compare', async () => {
  const materials = await read('materials', z.array(libraryMaterialSchema));
  const fibre = materials.find(({ id }) => id === 'std/mf_pipe');
  // specification maximum, ASHRAE Handbook Fundamentals 2021 (SI) chapter 23 table 8
  const points = [
    [-4, 0.034],
    [24, 0.035],
    [93, 0.043],
    [204, 0.061],
    [316, 0.091],
  ];
  expect(fibre?.curve).toMatchObject({ kind: 'max', points });
  expect(fibre?.curve.source).toContain('Table 8');
  expect(fibre?.otherCurves.length).toBeGreaterThan(0);
  const curves = materials.flatMap(({ curve, otherCurves }) => [curve, ...otherCurves]);
  expect(curves.filter((curve) => !isFilled(curve))).toEqual([]);
});

it('has made series, each named by what materials refer to', async () => {
  const series = await read('series', z.array(librarySeriesSchema));
  const materials = await read('materials', z.array(libraryMaterialSchema));
  const ids = new Set(series.map(({ id }) => id));
  expect(materials.flatMap((material) => material.series).filter((id) => !ids.has(id))).toEqual([]);
  expect(series.filter((row) => !isFilled(row) || row.names.length === 0)).toEqual([]);
});

it('has finishes with emittance as new and aged', async () => {
  const finishes = await read('finishes', z.array(libraryFinishSchema));
  // 0.1 as new, commercial aluminium sheet: ASHRAE Handbook Fundamentals 2021 chapter 23 table 12
  expect(finishes.find(({ id }) => id === 'std/aluminium-sheet')).toMatchObject({ emittanceNew: 0.1, bare: false });
  const share = (emittance: number) => emittance > 0 && emittance <= 1;
  const odd = finishes.filter((row) => !share(row.emittanceNew) || !share(row.emittanceAged) || !isFilled(row));
  expect(odd).toEqual([]);
});

describe('code editions', () => {
  it('band pipes in SI, a made name for each column', async () => {
    const codes = await read('codes', z.array(libraryCodeSchema));
    const bands = codes.find(({ id }) => id === 'ashrae-90.1-2019')!.pipes.bands;
    // above 350 °F (176.67 °C): 4.5 in below 1 in, 5 in from there up, k 0.32 to 0.34 Btu·in/(h·ft²·°F);
    // ASHRAE Handbook Fundamentals 2021 (SI) chapter 23 table 2 prints the range as 0.046 to 0.049 W/(m·K)
    const { from, thicknesses, conductivity } = bands.find(({ to }) => to === null)!;
    expect(from).toBeCloseTo(176.667, 3);
    expect(thicknesses).toEqual(['in:4.5', 'in:5', 'in:5', 'in:5', 'in:5']);
    expect(conductivity[0]).toBeCloseTo(0.046, 3);
    expect(conductivity[1]).toBeCloseTo(0.049, 3);
    const odd = codes.filter(({ pipes }) =>
      pipes.bands.some((band) => band.thicknesses.length !== pipes.columns.length),
    );
    expect(odd).toEqual([]);
    expect(codes.filter(({ pipes }) => !isFilled(pipes))).toEqual([]);
  });

  it('ask resistances of ducts by zone and location', async () => {
    const codes = await read('codes', z.array(libraryCodeSchema));
    const ducts = codes.find(({ id }) => id === 'ashrae-90.1-2019')!.ducts!;
    expect(ducts.locations.map(({ id }) => id)).toContain('indirectly_conditioned');
    // R-8 outdoors in zone 4, from memory of 90.1-2016 table 6.8.2: 8 x 0.1761 m²·K/W
    const zone = ducts.uses.find(({ use }) => use === 'both')!.zones.find(({ zone: number }) => number === 4)!;
    expect(zone.resistances[0]).toBeCloseTo(1.409, 3);
    expect(codes.filter((code) => code.ducts && !isFilled(code.ducts))).toEqual([]);
  });
});

it('has safety thresholds with their sources', async () => {
  const safety = await read('safety', librarySafetySchema);
  // 60 °C: industry practice, ASHRAE Handbook Fundamentals 2021 chapter 23
  expect(safety.touchDefaults.find(({ id }) => id === 'trained-people-plant-rooms')?.limit).toBe(60);
  // 51 °C metal for 1 min: ISO 13732-1, from memory
  expect(safety.touchThresholds).toContainEqual(expect.objectContaining({ contact: '1 min', limit: 51 }));
  expect([...safety.touchDefaults, ...safety.touchThresholds].filter((row) => !isFilled(row))).toEqual([]);
});
