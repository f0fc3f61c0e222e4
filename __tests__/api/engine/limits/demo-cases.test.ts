import { study } from '@/api/engine/limits/study';
import type { Body, Candidate, LimitInput, PlaceInput, StudyInput } from '@/api/engine/limits/study-types';
import { finish } from '@/api/engine/standards/library';
import { oneOf } from '@/api/engine/standards/reading';
import { pipeStandards, vapourRetarders } from '@/api/engine/standards/rows';
import { isThicknessName } from '@/api/engine/standards/thickness-name';

import cases from './demo-cases.json';
import { air, layer, pipe, steamInput } from './inputs';

type Case = (typeof cases.cases)[number];
type Expected = { verdict: string; margin?: number; surface?: number; state?: string; sweatsFrom?: number };

/** The invented demonstration job: an independent calculation by the same method, with its own air properties. */
describe.each(cases.cases)('$run of the demonstration job', (row) => {
  const { candidates, specified } = study(inputOf(row));
  const used = candidates[specified ?? NaN];
  if (!used) throw new Error(`${row.run} has no specified thickness`);

  it('has its heat and surface within 1 % and 0.2 K', () => {
    const { flow, flux, surface } = row.expected.heat;
    expect(Math.abs(used.heat.surface - surface)).toBeLessThan(0.2);
    const [value, expected] =
      flow === null || flow === undefined ? [used.heat.flux, flux ?? NaN] : [used.heat.heatFlow ?? NaN, flow];
    expect(Math.abs(value - expected)).toBeLessThan(Math.max(0.1, Math.abs(expected) / 100));
  });

  it('has its verdicts, with margins within tolerance', () => {
    for (const verdict of used.verdicts) compare(verdict, expectedOf(row, verdict.kind));
  });
});

// the independent calculation prints 0.1 mm, and rounds the table's R to 0.01
const tolerances = {
  temperature: 0.2,
  difference: 0.2,
  dimension: 1e-4,
  resistance: 0.01,
  heatPerLength: 0.2,
  heatFlux: 0.2,
} as const;

function compare(verdict: Candidate['verdicts'][number], expected: Expected | undefined): void {
  expect(verdict.verdict).toBe(expected?.verdict);
  if (!expected) return;
  const tolerance = tolerances[verdict.unit ?? 'difference'];
  if (expected.margin !== undefined)
    expect(Math.abs((verdict.margin ?? NaN) - expected.margin)).toBeLessThanOrEqual(tolerance);
  if (expected.state !== undefined) expect(verdict.state).toBe(expected.state);
  if (expected.sweatsFrom !== undefined)
    expect(Math.abs((verdict.sweatsFrom ?? NaN) - expected.sweatsFrom)).toBeLessThan(0.3);
}

const expectedOf = ({ expected }: Case, kind: string): Expected | undefined =>
  Object.entries(expected).flatMap(([name, answer]) => (name === kind && 'verdict' in answer ? [answer] : []))[0];

function inputOf(row: Case): StudyInput {
  const service = Object.entries(cases.services).find(([name]) => name === row.service)?.[1];
  if (!service) throw new Error(`No service ${row.service}`);
  const [lowest = NaN, operating = NaN, highest = NaN] = service.temperatures;
  return {
    ...steamInput,
    body: bodyOf(row.body),
    layers: row.layers.map((name) => layer(row.material, isThicknessName(name) ? name : null, row.installed)),
    finish: finish(`std/${row.finish}`),
    vapourRetarder: oneOf(vapourRetarders, row.vapourRetarder),
    states: [{ nature: oneOf(['hot', 'cold'] as const, service.nature), lowest, operating, highest }],
    place: placeOf(row.place),
    limits: service.limits.flatMap((limit) => limitOf(limit, row.place)),
    codeExempt: service.codeExempt,
  };
}

function bodyOf(body: Case['body']): Body {
  if (body.pipe) return pipe(oneOf(pipeStandards, body.pipe[0] ?? ''), body.pipe[1] ?? '');
  const [diameter, width, height, length] = [body.diameter, body.width, body.height, body.length].map(Number);
  if (body.shape === 'round-duct') return { shape: 'round-duct', diameter: Number(diameter) };
  if (body.shape === 'vessel') {
    return { shape: 'vessel', diameter: Number(diameter), length: Number(length), orientation: 'vertical' };
  }
  if (body.shape === 'flat') return { shape: 'flat', height: Number(height) };
  return { shape: 'rectangular-duct', width: Number(width), height: Number(height) };
}

function placeOf(id: string): PlaceInput {
  const place = Object.entries(cases.places).find(([name]) => name === id)?.[1];
  if (!place) throw new Error(`No place ${id}`);
  const at = ([dryBulb = NaN, humidity = null, wind]: (number | null)[]) => air(dryBulb ?? NaN, humidity, wind ?? 0);
  return {
    ...steamInput.place,
    ...place,
    name: id,
    reach: oneOf(['nobody', 'trained', 'public'] as const, place.reach),
    conditions: {
      hottest: at(place.air.hottest),
      mostHumid: at(place.air.mostHumid),
      coldest: at(place.air.coldest),
      warmest: at(place.air.warmest),
      mean: at(place.air.mean),
    },
  };
}

function limitOf([kind, only, value]: (string | number | null)[], place: string): LimitInput[] {
  if (only !== null && only !== place) return [];
  if (kind === 'dew-point') return [{ kind, margin: Number(value) }];
  if (kind === 'heat-flow') return [{ kind, perLength: Number(value), flux: null }];
  return kind === 'touch' || kind === 'energy-code' || kind === 'material' ? [{ kind }] : [];
}
