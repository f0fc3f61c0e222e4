import { spawnSync } from 'node:child_process';
import path from 'node:path';

const root = path.resolve(__dirname, '../..');
const run = (input: string) =>
  spawnSync(process.execPath, ['--import', 'tsx', 'scripts/solve.ts'], {
    cwd: root,
    input,
    encoding: 'utf8',
    maxBuffer: 2 ** 27,
  });

const good = {
  shape: 'horizontal-cylinder',
  outsideDiameter: 0.0603,
  layers: [
    {
      thickness: 0.05,
      conductivity: [
        [0, 0.034],
        [100, 0.043],
      ],
    },
  ],
  operatingTemperature: 82,
  airTemperature: 20,
  emittance: 0.9,
  surface: 'astm-c680',
};

it('reads cases, writes results in the same order, and ends well when all were solved', () => {
  const { status, stdout } = run(JSON.stringify([good, { ...good, windSpeed: 3 }]));
  const results: { heatFlow: number }[] = JSON.parse(stdout);
  expect(status).toBe(0);
  expect(results).toHaveLength(2);
  expect(results[1]?.heatFlow).toBeGreaterThan(results[0]?.heatFlow ?? NaN);
});

it('gives an error in the place of a case that cannot be solved, solves the others, and ends with 1', () => {
  const { status, stdout } = run(JSON.stringify([{ ...good, emittance: 0 }, good]));
  expect(status).toBe(1);
  expect(JSON.parse(stdout)).toEqual([
    { error: 'emittance must be above 0 and at most 1, got 0' },
    expect.objectContaining({ iterations: expect.any(Number) }),
  ]);
});

it.each([
  ['{ "cases": [] }', 'The input must be an array of cases'],
  ['[1,', 'The input is no JSON'],
])('says in one line that %s is no batch', (input, message) => {
  const { status, stderr } = run(input);
  expect(status).toBe(1);
  expect(stderr).toContain(message);
  expect(stderr.trim().split('\n')).toHaveLength(1);
});

it('solves 20,000 cases in seconds', () => {
  const cases = Array.from({ length: 20_000 }, (_, place) => ({ ...good, operatingTemperature: 30 + place / 100 }));
  const { status, stdout } = run(JSON.stringify(cases));
  expect(status).toBe(0);
  expect(JSON.parse(stdout)).toHaveLength(20_000);
}, 60_000);
