import { dewPoint } from '@/api/engine/limits/psychrometrics';
import { study } from '@/api/engine/limits/study';
import type { LimitInput, LimitVerdict, StudyInput } from '@/api/engine/limits/study-types';
import { finish } from '@/api/engine/standards/library';

import { air, chilled, chilledInput, ductInput, layer, plantRoom, steam, steamInput } from './inputs';

/** One limit's answer for the thickness that is specified. */
function verdictOf(input: StudyInput, limit: LimitInput): LimitVerdict {
  const { candidates, specified } = study({ ...input, limits: [limit] });
  const verdict = candidates[specified ?? NaN]?.verdicts[0];
  if (!verdict) throw new Error('No specified thickness');
  return verdict;
}
const conditions = (input: StudyInput, change: Partial<StudyInput['place']['conditions']>): StudyInput => ({
  ...input,
  place: { ...input.place, conditions: { ...input.place.conditions, ...change } },
});

describe('touch', () => {
  const touch = { kind: 'touch' } as const;
  it('is judged at the highest fluid, in the hottest air, still, with the emittance as new', () => {
    const windy = conditions(steamInput, { hottest: air(40, null, 5) });
    const verdict = verdictOf(windy, touch);
    expect(verdict.judgedAt).toMatchObject({ set: 'hottest', fluid: 184, air: 40, wind: 0, emittance: 0.1 });
    expect(verdict).toMatchObject({ verdict: 'not-met', limit: 60, unit: 'temperature' });
    expect(verdict.margin).toBeCloseTo(60 - (verdict.value ?? NaN), 9);
  });

  it('a dull finish is cooler than a bright one', () => {
    const dull = verdictOf({ ...steamInput, finish: finish('std/pvc-jacket') }, touch);
    expect(dull.value).toBeLessThan(verdictOf(steamInput, touch).value ?? NaN);
  });

  it('does not apply where nobody can reach, and cannot be told without a limit', () => {
    const place = (change: Partial<StudyInput['place']>) =>
      verdictOf({ ...steamInput, place: { ...plantRoom, ...change } }, touch);
    expect(place({ reach: 'nobody' })).toMatchObject({ verdict: 'does-not-apply', because: ['nobody can reach it'] });
    expect(place({ touchLimit: null }).verdict).toBe('cannot-tell');
  });
});

describe('dew point', () => {
  const limit = { kind: 'dew-point', margin: 1 } as const;
  it('is judged at the lowest fluid, in the most humid air, still, with the emittance as new', () => {
    const verdict = verdictOf(conditions(chilledInput, { mostHumid: air(35, 60, 4) }), limit);
    expect(verdict.judgedAt).toMatchObject({
      set: 'mostHumid',
      fluid: 5,
      air: 35,
      humidity: 60,
      wind: 0,
      emittance: 0.9,
    });
    expect(verdict.dewPoint).toBeCloseTo(dewPoint(35, 60), 9);
    expect(verdict.limit).toBeCloseTo(dewPoint(35, 60) + 1, 9);
    expect(verdict).toMatchObject({ verdict: 'met', state: 'dry' });
  });

  it('tells marginal from sweating, and from which humidity', () => {
    const at = (humidity: number) => verdictOf(conditions(chilledInput, { mostHumid: air(35, humidity) }), limit);
    const from = at(60).sweatsFrom ?? NaN;
    expect(at(from - 0.5)).toMatchObject({ verdict: 'not-met', state: 'marginal' });
    expect(at(from + 0.5)).toMatchObject({ verdict: 'not-met', state: 'sweats' });
    expect(at(from - 10)).toMatchObject({ verdict: 'met', state: 'dry' });
  });

  it('cannot tell without humidity', () => {
    expect(verdictOf(conditions(chilledInput, { mostHumid: air(35) }), limit).verdict).toBe('cannot-tell');
  });
});

describe('heat flow', () => {
  const limit = (perLength: number | null, flux: number | null) => ({ kind: 'heat-flow', perLength, flux }) as const;
  it('hot service is judged in the coldest air with its wind, emittance aged', () => {
    const verdict = verdictOf(conditions(steamInput, { coldest: air(-12, null, 6) }), limit(100, null));
    expect(verdict.judgedAt).toMatchObject({ set: 'coldest', fluid: 170, air: -12, wind: 6, emittance: 0.2 });
    expect(verdict).toMatchObject({ unit: 'heatPerLength', limit: 100 });
  });

  it('cold service in the warmest air: gain counts as loss', () => {
    const verdict = verdictOf(conditions(chilledInput, { warmest: air(36, null, 3) }), limit(20, null));
    expect(verdict.judgedAt).toMatchObject({ set: 'warmest', fluid: 6, air: 36, wind: 3 });
    expect(verdict.value).toBeGreaterThan(0);
  });

  it('of two limits the worse counts', () => {
    expect(verdictOf(steamInput, limit(1000, 1))).toMatchObject({ verdict: 'not-met', unit: 'heatFlux' });
    expect(verdictOf(steamInput, limit(1, 1000))).toMatchObject({ verdict: 'not-met', unit: 'heatPerLength' });
  });

  it('a rectangular duct counts the mean perimeter P + 4t, a flat has no length', () => {
    const { candidates, specified } = study({ ...ductInput, limits: [] });
    const heat = candidates[specified ?? NaN]?.heat;
    expect(heat?.heatFlow).toBeCloseTo((heat?.flux ?? NaN) * (3 + 4 * 0.0508), 9);
    const flat = { ...ductInput, body: { shape: 'flat', height: 0.5 } as const };
    expect(verdictOf(flat, limit(10, null)).verdict).toBe('cannot-tell');
  });

  it('cannot tell without a value', () => expect(verdictOf(steamInput, limit(null, null)).verdict).toBe('cannot-tell'));
});

describe('material', () => {
  const limit = { kind: 'material' } as const;
  const of = (change: Partial<StudyInput>, base = steamInput) => verdictOf({ ...base, ...change }, limit);

  it('is met by what is usually put up', () => {
    expect(of({})).toMatchObject({ verdict: 'met', unit: 'temperature' });
    expect(of({}, chilledInput).verdict).toBe('met');
  });

  it('holds the finish to its own limit', () => {
    // PVC stands 60 °C (trade practice, from memory); 1 in on steam at 184 °C is hotter behind bright, cooler behind white
    const hot = of({ finish: finish('std/pvc-jacket'), layers: [layer('mf_pipe', 'in:0.5')] });
    expect(hot).toMatchObject({ verdict: 'not-met', limit: 60 });
    expect(hot.value).toBeGreaterThan(60);
    expect(of({ finish: finish('std/canvas') }).verdict).toBe('cannot-tell');
  });

  it('holds each layer to its use limits at both ends', () => {
    // C534 Grade 1 stands 104 °C; C1290 wrap goes down to 4 °C; C533 calcium silicate to 27 °C
    expect(of({ layers: [layer('elastomeric', 'in:1')] })).toMatchObject({ verdict: 'not-met', limit: 104 });
    const cold = { ...ductInput, states: [{ nature: 'cold', operating: 8, lowest: -12, highest: 36 }] as const };
    expect(of({ layers: [layer('mf_blanket_wrap', 'in:2')] }, cold)).toMatchObject({
      verdict: 'not-met',
      limit: 4,
      value: -12,
    });
    expect(of({ layers: [layer('calsil', 'in:2')] }, chilledInput).verdict).toBe('not-met');
  });

  it('protects an inner layer by an outer one, and judges where they meet', () => {
    // foam over fibre on steam begins where the fibre ends: within its 104 °C, but its mean beyond the published 48.9 °C
    const layers = [layer('mf_pipe', 'in:3'), layer('elastomeric', 'in:1')];
    expect(of({ layers }).verdict).toBe('cannot-tell');
    expect(of({ layers: [...layers].reverse() })).toMatchObject({ verdict: 'not-met', limit: 104, value: 184 });
  });

  it('asks for a vapour retarder where the fluid is below the dew point', () => {
    expect(of({ vapourRetarder: 'none' }, chilledInput).verdict).toBe('not-met');
    expect(of({ vapourRetarder: 'closed-cell' }, chilledInput).verdict).toBe('not-met');
    expect(of({ vapourRetarder: 'closed-cell', layers: [layer('elastomeric', 'in:1')] }, chilledInput).verdict).toBe(
      'met',
    );
    const dry = conditions(chilledInput, { mostHumid: air(24, 20) });
    expect(of({ vapourRetarder: 'none' }, dry).verdict).toBe('met');
  });

  it('asks for 25/50 in a plenum', () => {
    const place = { ...plantRoom, plenum: true };
    expect(of({ place }).verdict).toBe('met');
    expect(of({ place, layers: [layer('polyolefin', 'in:1')], states: [chilled] }).verdict).not.toBe('met');
  });

  it('cannot tell where a layer’s mean lies outside the published points', () => {
    const states = [{ nature: 'hot', operating: 60, lowest: 55, highest: 80 }] as const;
    // elastomeric is published to 48.9 °C mean: 80 °C fluid in 40 °C air has a mean above it
    expect(of({ states, layers: [layer('elastomeric', 'in:1')] }).verdict).toBe('cannot-tell');
    expect(
      of({ states: [{ ...states[0], highest: 48, operating: 46, lowest: 45 }], layers: [layer('elastomeric', 'in:1')] })
        .verdict,
    ).toBe('met');
  });

  it('of dual temperatures judges both extremes', () => {
    const layers = [layer('elastomeric', 'in:1')];
    const dual = of({ states: [chilled, steam], layers, vapourRetarder: 'closed-cell' }, chilledInput);
    expect(dual).toMatchObject({ verdict: 'not-met', limit: 104 });
  });
});
