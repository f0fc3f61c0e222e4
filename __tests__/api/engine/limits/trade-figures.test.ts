import { dewPoint } from '@/api/engine/limits/psychrometrics';
import { study } from '@/api/engine/limits/study';
import type { Candidate, StudyInput } from '@/api/engine/limits/study-types';
import { finish } from '@/api/engine/standards/library';
import type { ThicknessName } from '@/api/engine/standards/thickness-name';

import { air, chilledInput, layer, pipe, plantRoom, steamInput } from './inputs';

// Figures that a contractor worked out by textbook heat transfer with made diameters and specification-maximum curves:
// checks of consistency with an independent calculation, no published source.
const used = (input: StudyInput, name: ThicknessName | null): Candidate => {
  const candidate = study(input).candidates.find((other) => other.name === name);
  if (!candidate) throw new Error(`${name} is not made`);
  return candidate;
};
const still = (dryBulb: number, humidity: number | null = null) => {
  const same = air(dryBulb, humidity);
  return { ...plantRoom, conditions: { hottest: same, mostHumid: same, coldest: same, warmest: same, mean: same } };
};
const heating = (size: string): StudyInput => ({
  ...steamInput,
  body: pipe('asme-steel', size),
  finish: finish('std/all-service-jacket'),
  states: [{ nature: 'hot', operating: 82, lowest: 82, highest: 82 }],
  place: still(20),
  limits: [],
});

describe('heating water at 82 °C in 20 °C: bare and under 51 mm, W/m', () => {
  it.each([
    ['NPS 1', 93, 9.9],
    ['NPS 2', 159, 13.8],
    ['NPS 3', 228, 18.0],
    ['NPS 4', 288, 21.5],
    ['NPS 6', 416, 28.7],
  ])('%s', (size, bare, insulated) => {
    // bare was taken with an emittance of 0.9 there, with ASHRAE's 0.8 for steel here: 5 to 6 % less
    expect(Math.abs((used(heating(size), null).heat.heatFlow ?? NaN) / bare - 0.945)).toBeLessThan(0.01);
    expect(Math.abs((used(heating(size), 'in:2').heat.heatFlow ?? NaN) / insulated - 1)).toBeLessThan(0.02);
  });
});

describe('steam on DN 100 in 35 °C under 25 mm', () => {
  const surface = (id: string, highest: number, name: ThicknessName = 'in:1') =>
    used(
      {
        ...steamInput,
        finish: finish(id),
        states: [{ nature: 'hot', operating: highest, lowest: highest, highest }],
        place: still(35),
        limits: [{ kind: 'touch' }],
      },
      name,
    ).verdicts[0]?.value ?? NaN;
  it.each([
    ['std/pvc-jacket', 170, 51.3],
    ['std/weathered-aluminium', 170, 57.5],
    ['std/aluminium-sheet', 170, 64.0],
    ['std/pvc-jacket', 184, 53.2],
    ['std/weathered-aluminium', 184, 59.9],
    ['std/aluminium-sheet', 184, 67.1],
  ])('%s at %p °C: surface %p °C', (id, highest, printed) => {
    expect(Math.abs(surface(id, highest) - printed)).toBeLessThan(0.5);
  });

  it('38 mm of bright metal passes at 184 °C, 25 mm does not', () => {
    expect(surface('std/aluminium-sheet', 184, 'in:1.5')).toBeLessThan(60);
    expect(surface('std/aluminium-sheet', 184)).toBeGreaterThan(60);
  });
});

describe('chilled water at 6 °C on DN 150: thinnest with a margin of 1 K', () => {
  const thinnest = (id: string, place: StudyInput['place'], change: Partial<StudyInput> = {}) => {
    const result = study({
      ...chilledInput,
      finish: finish(id),
      layers: [layer('mf_pipe', null)],
      states: [{ nature: 'cold', operating: 6, lowest: 6, highest: 6 }],
      limits: [{ kind: 'dew-point', margin: 1 }],
      place,
      ...change,
    });
    return result.proposed === null ? null : result.candidates[result.proposed]?.name;
  };
  it.each([
    { id: 'std/all-service-jacket', place: still(27, 80), name: 'in:1.5' },
    { id: 'std/aluminium-sheet', place: still(27, 80), name: 'in:2.5' },
    { id: 'std/all-service-jacket', place: still(32, 90), name: 'in:4' },
    { id: 'std/aluminium-sheet', place: still(32, 90), name: null },
  ])('$id: $name', ({ id, place, name }) => expect(thinnest(id, place)).toBe(name));

  it('cellular glass on a roof at 35 °C and 85 %: bright sweats whatever is made, painted takes 64 mm', () => {
    const glass = { layers: [layer('cellular_glass', null)] };
    expect(thinnest('std/aluminium-sheet', still(35, 85), glass)).toBeNull();
    expect(thinnest('std/white-painted-aluminium', still(35, 85), glass)).toBe('in:2.5');
  });
});

it.each([
  [24, 50, 12.9],
  [27, 80, 23.3],
  [28, 75, 23.2],
  [29.4, 85, 26.6],
  [32, 85, 29.2],
  [35, 85, 32.1],
])('air at %p °C and %p %% has its dew point at %p °C', (dryBulb, humidity, dew) => {
  expect(Math.abs(dewPoint(dryBulb, humidity) - dew)).toBeLessThan(0.06);
});

// geometry on made outside diameters
it.each([
  ['NPS 1', 'in:1', 0.279],
  ['NPS 2', 'in:1', 0.359],
  ['NPS 2', 'in:2', 0.528],
  ['NPS 4', 'in:2', 0.688],
  ['NPS 6', 'in:2', 0.858],
  ['NPS 8', 'in:2', 1.017],
] as const)('finished surface of %s with %s: %p m² per metre', (size, name, area) => {
  expect(Math.PI * (used(heating(size), name).outsideDiameter ?? NaN)).toBeCloseTo(area, 3);
});
