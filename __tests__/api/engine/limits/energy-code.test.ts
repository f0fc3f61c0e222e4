import { adjustedThickness, bandOf } from '@/api/engine/limits/code-pipe';
import { study } from '@/api/engine/limits/study';
import type { LimitVerdict, StudyInput } from '@/api/engine/limits/study-types';
import { findCodeEdition } from '@/api/engine/standards/energy-codes';

import { ductInput, layer, pipe, steamInput } from './inputs';

const inch = 0.0254;

/** The energy code's answer for the thickness that is specified. */
function verdictOf(input: StudyInput): LimitVerdict {
  const { candidates, specified } = study({ ...input, limits: [{ kind: 'energy-code' }] });
  const verdict = candidates[specified ?? NaN]?.verdicts[0];
  if (!verdict) throw new Error('No specified thickness');
  return verdict;
}

// own computation by the equation that ASHRAE Handbook Fundamentals 2021 ch. 23 Table 2 quotes from 90.1, in inches
it.each([
  { size: 'NPS 4', radius: 2.25, thickness: 2, ratio: 0.32 / 0.29, adjusted: 2.289 },
  { size: 'NPS 4', radius: 2.25, thickness: 2, ratio: 0.2 / 0.29, adjusted: 1.239 },
  { size: 'NPS 2', radius: 1.1875, thickness: 1.5, ratio: 0.3 / 0.28, adjusted: 1.661 },
  { size: 'NPS 1/2', radius: 0.42, thickness: 1, ratio: 0.24 / 0.28, adjusted: 0.773 },
  { size: 'NPS 8', radius: 4.3125, thickness: 1, ratio: 0.31 / 0.27, adjusted: 1.167 },
  { size: 'NPS 6', radius: 3.3125, thickness: 5, ratio: 0.45 / 0.34, adjusted: 7.882 },
])('$size: $thickness in becomes $adjusted in', ({ radius, thickness, ratio, adjusted }) => {
  expect(adjustedThickness(thickness, { radius, ratio })).toBeCloseTo(adjusted, 3);
});

describe('bands are compared in °F to a tenth, without gaps', () => {
  // bands of 90.1 Table 6.8.3 read as continuous
  it.each([
    [4.3, '<40'],
    [4.44, '40-60'],
    [15.6, undefined],
    [15.5, '40-60'],
    [25, undefined],
    [40.5, undefined],
    [40.6, '105-140'],
    [60, '105-140'],
    [60.1, '141-200'],
    [93.3, '141-200'],
    [93.4, '201-250'],
    [121.2, '251-350'],
    [176.6, '251-350'],
    [177, '>350'],
  ])('%p °C is in %p', (operating, printed) => {
    const edition = findCodeEdition('ashrae-90.1-2019');
    expect(edition && bandOf(edition, operating)?.printed).toBe(printed);
  });
});

describe('pipes', () => {
  it('in the conductivity range are met by the name', () => {
    // 90.1-2019: above 250 to 350 °F, 4 to below 8 in: 4-1/2 in; K of mineral fibre at 200 °F is 0.30, in 0.29 to 0.32
    expect(verdictOf(steamInput)).toMatchObject({ verdict: 'not-met', limit: 4.5 * inch, unit: 'dimension' });
    expect(verdictOf(steamInput).margin).toBeCloseTo(-3 * inch, 9);
    expect(verdictOf({ ...steamInput, layers: [layer('mf_pipe', 'in:4.5')] })).toMatchObject({
      verdict: 'met',
      margin: 0,
    });
  });

  it('two layers are named by their sum', () => {
    const layers = [layer('mf_pipe', 'in:2.5'), layer('mf_pipe', 'in:2')];
    expect(verdictOf({ ...steamInput, layers })).toMatchObject({ verdict: 'met', margin: 0 });
  });

  it('outside the range compare the actual thickness with the adjusted one', () => {
    // cellular glass at 75 °F: 0.31 against 0.21 to 0.27; 1 in on NPS 6 becomes 29.8 mm, 2 in measures 52.4
    const input = { ...steamInput, body: pipe('asme-steel', 'NPS 6'), layers: [layer('cellular_glass', 'in:2')] };
    const verdict = verdictOf({ ...input, states: [{ nature: 'cold', operating: 6, lowest: 5, highest: 15 }] });
    expect(verdict.verdict).toBe('met');
    expect(verdict.limit).toBeCloseTo(0.0298, 4);
    expect(verdict.value).toBeCloseTo(0.0524, 4);
  });

  it('take the lower end in Title 24, the upper elsewhere', () => {
    const layers = [layer('cellular_glass', 'in:2')];
    const input: StudyInput = {
      ...steamInput,
      layers,
      states: [{ nature: 'cold', operating: 6, lowest: 5, highest: 15 }],
    };
    const [upper, lower] = ['ashrae-90.1-2019', 'title-24-2022'].map((codeEdition) =>
      verdictOf({ ...input, codeEdition }),
    );
    expect(upper?.limit).toBeCloseTo(adjustedThickness(inch, { radius: 0.05715, ratio: 0.31 / 0.27 }), 6);
    expect(lower?.limit).toBeCloseTo(adjustedThickness(inch, { radius: 0.05715, ratio: 0.31 / 0.21 }), 6);
  });

  it('compare a metric name by its actual thickness', () => {
    const verdict = verdictOf({ ...steamInput, layers: [layer('mf_pipe', 'mm:120')] });
    expect(verdict).toMatchObject({ verdict: 'met', limit: 4.5 * inch });
    expect(verdict.value).toBeCloseTo(0.12, 9);
  });

  it('do not ask between 60 and 105 °F', () => {
    const states = [{ nature: 'hot', operating: 30, lowest: 25, highest: 35 }] as const;
    expect(verdictOf({ ...steamInput, states })).toMatchObject({ verdict: 'does-not-apply' });
  });

  it('cannot tell where the size has no nominal inches, the curve ends early, or no table is entered', () => {
    const tube = { ...steamInput, body: pipe('en-1057', '54 mm') };
    expect(verdictOf(tube).verdict).toBe('cannot-tell');
    const states = [{ nature: 'hot', operating: 60, lowest: 55, highest: 70 }] as const;
    // C1427 polyolefin is published to 24 °C mean, the band of hot water is rated at 100 °F
    const early = { ...steamInput, states, layers: [layer('polyolefin', 'in:1')] };
    expect(verdictOf(early).verdict).toBe('cannot-tell');
    expect(verdictOf({ ...steamInput, codeEdition: 'none' }).verdict).toBe('cannot-tell');
  });

  it('do not apply where exempt, and say why', () => {
    const verdict = verdictOf({ ...steamInput, codeExempt: 'it belongs to rated equipment' });
    expect(verdict).toMatchObject({ verdict: 'does-not-apply', because: ['it belongs to rated equipment'] });
  });

  it('of two states answer the worse', () => {
    const states = [
      { nature: 'cold', operating: 6, lowest: 5, highest: 15 },
      { nature: 'hot', operating: 170, lowest: 160, highest: 184 },
    ] as const;
    expect(verdictOf({ ...steamInput, states })).toMatchObject({ verdict: 'not-met', limit: 4.5 * inch });
  });
});

describe('ducts', () => {
  it('compare installed R at 24 °C with zone and location', () => {
    // 90.1-2016/2019 Table 6.8.2, zone 4, unconditioned space: R-6; 2 in of board at 0.035: 1.451 m²·K/W
    const verdict = verdictOf(ductInput);
    expect(verdict).toMatchObject({ verdict: 'met', unit: 'resistance' });
    expect(verdict.limit).toBeCloseTo(1.057, 3);
    expect(verdict.value).toBeCloseTo(0.0508 / 0.035, 6);
  });

  it('judge wrap by what is left of it', () => {
    const verdict = verdictOf({ ...ductInput, layers: [layer('mf_blanket_wrap', 'in:2')] });
    expect(verdict.value).toBeCloseTo(0.0381 / (0.04 + (4 / 30) * 0.007), 6);
    expect(verdict.verdict).toBe('not-met');
  });

  it('are a table for cooling, for heating and for both', () => {
    const zone7 = { ...ductInput, climateZone: '7' };
    const hot = { nature: 'hot', operating: 45, lowest: 40, highest: 50 } as const;
    const limit = (input: StudyInput) => (verdictOf(input).limit ?? NaN) / 0.1761101838;
    expect(limit(zone7)).toBeCloseTo(1.9, 6);
    expect(limit({ ...zone7, states: [hot] })).toBeCloseTo(6, 6);
    expect(limit({ ...zone7, states: [...zone7.states, hot] })).toBeCloseTo(6, 6);
  });

  it('cannot tell without location, zone or table', () => {
    const nowhere = { ...ductInput, place: { ...ductInput.place, ductLocation: null } };
    expect(verdictOf(nowhere).verdict).toBe('cannot-tell');
    expect(verdictOf({ ...ductInput, climateZone: '' }).verdict).toBe('cannot-tell');
    expect(verdictOf({ ...ductInput, codeEdition: 'title-24-2022' }).verdict).toBe('cannot-tell');
    expect(verdictOf({ ...ductInput, codeEdition: 'iecc-2021' }).verdict).toBe('cannot-tell');
  });
});

it('covers no equipment', () => {
  const vessel = { shape: 'vessel', diameter: 0.9, length: 1.9, orientation: 'vertical' } as const;
  const verdict = verdictOf({ ...steamInput, body: vessel, layers: [layer('mf_board', 'in:2')] });
  expect(verdict).toMatchObject({ verdict: 'does-not-apply', because: ['the table entered covers piping'] });
});
