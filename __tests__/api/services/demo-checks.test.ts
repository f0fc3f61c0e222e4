import type { JudgedRun } from '@/api/contracts/judgement';
import type { LimitKind } from '@/api/engine/limits/study-types';
import { judge, judgementOf } from '@/api/services/judging';
import { demoInMemory } from '@/db/seeds/demo/in-memory';

import expected from './demo/expected-checks.json';

const { tolerance } = expected;
type Judged = ReadonlyMap<string, JudgedRun>;
type Surface = { verdict: string; surface?: number; margin?: number; state?: string; dewPoint?: number };
type Checks = {
  touch?: Surface;
  dewPoint?: Surface & { sweatsFrom?: number };
  heat: { heatFlow?: number; flux?: number; surface: number };
  energyCode: { verdict: string; margin?: number; resistance?: number };
  material: { verdict: string };
  heatFlowLimit?: { verdict: string; heatFlow: number; margin: number };
  outsideDiameter?: number;
};

async function judgedRuns(state: 'revision-a' | 'addendum-1'): Promise<Judged> {
  const data = await demoInMemory(state);
  const numbers = new Map(data.runs.map(({ id, number }) => [id, number]));
  return new Map(judgementOf(judge(data)).runs.map((run) => [numbers.get(run.runId)!, run]));
}

const near = (value: number | null | undefined, wanted: number, within: number) => {
  expect(Math.abs((value ?? NaN) - wanted)).toBeLessThanOrEqual(within);
};
const nearHeat = (value: number | null | undefined, wanted: number) =>
  near(value, wanted, Math.max(tolerance.heatLeast, tolerance.heatShare * Math.abs(wanted)));

describe.each([
  ['with Addendum 1', 'addendum-1' as const, expected.runs],
  ['of Revision A', 'revision-a' as const, expected.revisionA],
])('the invented demo job %s', (_title, state, listed) => {
  const cases: [string, Checks][] = Object.entries(listed);
  let runs: Judged;
  beforeAll(async () => {
    runs = await judgedRuns(state);
  });
  const verdictOf = (run: string, kind: LimitKind) => runs.get(run)!.verdicts.find((verdict) => verdict.kind === kind);

  function expectSurface(run: string, kind: 'touch' | 'dew-point', wanted: Surface): void {
    const verdict = verdictOf(run, kind);
    expect(verdict?.verdict).toBe(wanted.verdict);
    if (wanted.surface === undefined) return;
    near(verdict?.value, wanted.surface, tolerance.surface);
    near(verdict?.margin, wanted.margin!, tolerance.margin);
    expect(verdict?.state).toBe(wanted.state ?? null);
    if (wanted.dewPoint !== undefined) near(verdict?.dewPoint, wanted.dewPoint, 0.02);
  }

  it.each(cases)('%s has its surfaces', (run, { touch, dewPoint }) => {
    if (touch) expectSurface(run, 'touch', touch);
    else expect(verdictOf(run, 'touch')).toBeUndefined();
    if (dewPoint) expectSurface(run, 'dew-point', dewPoint);
    else expect(verdictOf(run, 'dew-point')).toBeUndefined();
    // one K of surface is about 6 % of humidity here
    if (dewPoint?.sweatsFrom) near(verdictOf(run, 'dew-point')?.sweatsFrom, dewPoint.sweatsFrom, 1.2);
  });

  it.each(cases)('%s has its heat under mean air', (run, { heat }) => {
    const { heatFlow, flux, names } = runs.get(run)!;
    expect(names.length).toBeGreaterThan(0);
    if (heat.heatFlow !== undefined) nearHeat(heatFlow, heat.heatFlow);
    if (heat.flux !== undefined) nearHeat(flux, heat.flux);
  });

  it.each(cases)('%s has its verdict on the code row and its margin', (run, { energyCode }) => {
    const verdict = verdictOf(run, 'energy-code');
    expect(verdict?.verdict).toBe(energyCode.verdict);
    if (energyCode.margin === undefined) return;
    if (energyCode.resistance === undefined) return near(verdict?.margin, energyCode.margin, tolerance.code);
    near(verdict?.value, energyCode.resistance, tolerance.resistance);
    // the table's stand there in SI with two digits: 0.34, 1.06, 1.41
    near(verdict?.margin, energyCode.margin, 0.0055);
  });

  it.each(cases)('%s has its materials within their limits, and its heat-flow limit', (run, checks) => {
    expect(verdictOf(run, 'material')?.verdict).toBe(checks.material.verdict);
    const flow = verdictOf(run, 'heat-flow');
    expect(flow?.verdict).toBe(checks.heatFlowLimit?.verdict);
    if (!checks.heatFlowLimit) return;
    nearHeat(Math.abs(flow!.value!), checks.heatFlowLimit.heatFlow);
    nearHeat(flow!.margin, checks.heatFlowLimit.margin);
  });

  it.each(cases)('%s has its made outside diameter', (run, { outsideDiameter }) => {
    if (outsideDiameter !== undefined) near(runs.get(run)!.outsideDiameter, outsideDiameter, 0.00006);
  });
});
