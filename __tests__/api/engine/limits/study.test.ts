import { wordsText } from '@/api/contracts/words-text';
import { EngineError } from '@/api/engine/engine-error';
import { study } from '@/api/engine/limits/study';
import type { Study, StudyInput } from '@/api/engine/limits/study-types';
import { finish } from '@/api/engine/standards/library';
import type { Words } from '@/api/engine/words';

import { air, chilled, chilledInput, ductInput, layer, pipe, plantRoom, steam, steamInput } from './inputs';

const said = (words: Words) => wordsText(words, 'SI');
const names = ({ candidates }: Study) => candidates.map(({ name }) => name);
const nameAt = ({ candidates }: Study, place: number | null) => (place === null ? null : candidates[place]?.name);

describe('candidates', () => {
  it('are bare first, then every made name, thin to thick', () => {
    expect(names(study(steamInput))).toEqual([
      null,
      'in:0.5',
      'in:1',
      'in:1.5',
      'in:2',
      'in:2.5',
      'in:3',
      'in:3.5',
      'in:4',
      'in:4.5',
      'in:5',
    ]);
  });

  it('are in the series asked for where nothing is specified, else in that of the specified name', () => {
    const open = { ...steamInput, layers: [layer('mf_pipe', null)] };
    expect(names(study({ ...open, seriesUnit: 'mm' }))).toContain('mm:60');
    expect(names(study({ ...steamInput, seriesUnit: 'mm' }))).not.toContain('mm:60');
    expect(study({ ...open, seriesUnit: 'mm' }).specified).toBeNull();
  });

  it('hold a specified name that the series has not, in its place', () => {
    const result = study({ ...steamInput, layers: [layer('mf_pipe', 'in:1.25')] });
    expect(names(result).slice(2, 5)).toEqual(['in:1', 'in:1.25', 'in:1.5']);
    expect(nameAt(result, result.specified)).toBe('in:1.25');
    expect(result.candidates[result.specified ?? NaN]?.basis).toBe('nominal');
  });

  it('are boards and wraps on ducts, boards on vessels, none where nothing is made', () => {
    expect(names(study(ductInput))).toEqual([null, 'in:1', 'in:1.5', 'in:2', 'in:2.5', 'in:3', 'in:4']);
    const vessel = { shape: 'vessel', diameter: 0.9, length: 1.9, orientation: 'vertical' } as const;
    expect(names(study({ ...steamInput, body: vessel, layers: [layer('mf_board', 'in:2')] }))).toContain('in:4');
    const none = study({ ...steamInput, body: { shape: 'flat', height: 1 }, layers: [layer('pir', null)] });
    expect(names(none)).toEqual([null]);
    expect(said(none.sentence)).toContain('No thickness of this material');
  });

  it('nest the outer layer on the inner one', () => {
    const layers = [layer('mf_pipe', 'in:2.5'), layer('mf_pipe', 'in:2')];
    const result = study({ ...steamInput, layers });
    const used = result.candidates[result.specified ?? NaN];
    // TRADE figures recomputed by geometry: 64 mm on DN 100 is 244 mm, 51 mm nesting on it 356 mm over all
    expect(used).toMatchObject({
      names: ['in:2.5', 'in:2'],
      basis: 'made',
      outsideDiameter: expect.closeTo(0.3556, 4),
    });
    expect(used?.heat.interfaces).toHaveLength(3);
  });

  it('take a wrap at 75 % of its name, or as it is given', () => {
    const wrap = (installed: number | null) =>
      study({ ...ductInput, layers: [layer('mf_blanket_wrap', 'in:2', installed)] });
    const used = (result: Study) => result.candidates[result.specified ?? NaN];
    expect(used(wrap(null))?.layerThicknesses[0]).toBeCloseTo(0.0381, 9);
    expect(used(wrap(null))?.notes.join()).toContain('25 % compressed');
    expect(used(wrap(0.042))?.layerThicknesses).toEqual([0.042]);
    const thinner = wrap(0.042).candidates.find(({ name }) => name === 'in:1.5');
    expect(thinner?.layerThicknesses[0]).toBeCloseTo(0.0381 * 0.75, 9);
  });
});

describe('proposal', () => {
  it('is the thinnest made that meets every limit, governed by what forbids the next thinner', () => {
    const result = study(steamInput);
    expect(nameAt(result, result.proposed)).toBe('in:4.5');
    expect(result.governing).toBe('energy-code');
    const touch = result.meets.find(({ kind }) => kind === 'touch');
    expect(nameAt(result, touch?.candidate ?? null)).toBe('in:2');
  });

  it('is said as a foreman would', () => {
    expect(said(study({ ...steamInput, layers: [layer('mf_pipe', null)] }).sentence)).toBe(
      '114 mm meets every limit; the energy code governs: 102 mm falls one size short.',
    );
    const specified = study({
      ...steamInput,
      place: { ...plantRoom, conditions: { ...plantRoom.conditions, hottest: air(40) } },
    });
    expect(said(specified.sentence)).toMatch(
      /^38 mm is not enough\. It would reach 6\d\.\d °C where hands can; the limit is 60 °C\.$/,
    );
    expect(said(specified.whyNotThinner)).toBe(
      '114 mm is the thinnest made that meets every limit. 102 mm falls one size short of the energy code.',
    );
  });

  it('is none where nothing made will do, and the sentence says what is never met', () => {
    const place = { ...plantRoom, conditions: { ...plantRoom.conditions, mostHumid: air(35, 98) } };
    const result = study({ ...chilledInput, place, finish: finish('std/aluminium-sheet') });
    expect(result).toMatchObject({ proposed: null, governing: 'dew-point' });
    expect(said(result.whyNotThinner)).toMatch(/^Nothing made meets the dew point: even 127 mm would sweat/);
  });

  it('says when bare would do', () => {
    const states = [{ nature: 'hot', operating: 45, lowest: 45, highest: 45 }] as const;
    const result = study({ ...steamInput, states, limits: [{ kind: 'touch' }], layers: [layer('mf_pipe', null)] });
    expect(said(result.whyNotThinner)).toBe(
      '13 mm is the thinnest made, and meets every limit. Bare would meet every limit entered too.',
    );
    expect(result.governing).toBeNull();
  });

  it('does not call a name thinner that shares the made diameter', () => {
    // ASTM C585 has 4-1/2 and 5 in on NPS 3-1/2 at 14 in; steam above 350 °F asks for 5 in
    const states = [{ nature: 'hot', operating: 185, lowest: 180, highest: 190 }] as const;
    const body = pipe('asme-steel', 'NPS 3-1/2');
    const result = study({
      ...steamInput,
      states,
      body,
      layers: [layer('mf_pipe', null)],
      limits: [{ kind: 'energy-code' }],
    });
    expect(nameAt(result, result.proposed)).toBe('in:5');
    expect(said(result.whyNotThinner)).toContain('102 mm falls');
  });

  it('never promises', () => {
    const texts = [steamInput, chilledInput, ductInput].flatMap((input) => {
      const { sentence, whyNotThinner, notes } = study(input);
      return [said(sentence), said(whyNotThinner), ...notes];
    });
    for (const text of texts) expect(text).not.toMatch(/\bsafe\b|compl(y|ies)|guarantee|approved/i);
  });
});

describe('dual temperature', () => {
  const dual: StudyInput = {
    ...chilledInput,
    states: [{ nature: 'hot', operating: 82, lowest: 60, highest: 95 }, chilled],
    limits: [{ kind: 'touch' }, { kind: 'dew-point', margin: 1 }, { kind: 'energy-code' }, { kind: 'material' }],
  };
  it('judges both states, the worse counts', () => {
    const { candidates, specified } = study(dual);
    const verdicts = candidates[specified ?? NaN]?.verdicts ?? [];
    expect(verdicts.map(({ kind, judgedAt }) => [kind, judgedAt?.fluid ?? null])).toEqual([
      ['touch', 95],
      ['dew-point', 5],
      ['energy-code', null],
      ['material', expect.any(Number)],
    ]);
    expect(verdicts[2]?.limit).toBeCloseTo(0.0508, 6); // 2 in for 141 to 200 °F asks for more than 1 in for 40 to 60
  });
});

it('each result carries its conditions, the engine’s version and method', () => {
  const result = study({ ...steamInput, method: 'iso-12241' });
  expect(result).toMatchObject({ engineVersion: expect.stringMatching(/^\d+\.\d+\.\d+$/), method: 'iso-12241' });
  for (const { heat } of result.candidates) {
    expect(heat.judgedAt).toMatchObject({ set: 'mean', fluid: 170, air: 30, source: 'invented' });
    expect(Math.abs(heat.closure)).toBeLessThan(1e-9);
  }
});

it('says that sun and sky are not counted outdoors, and that a cold code row is energy only', () => {
  const notes = study({ ...chilledInput, place: { ...plantRoom, outdoor: true } }).notes.join(' ');
  expect(notes).toContain('Sun and the clear night sky are not counted.');
  expect(notes).toContain('promises no dry surface');
});

describe('refusals name the case and the field', () => {
  const attempt = (change: Partial<StudyInput>) => () => study({ ...steamInput, ...change });
  const place = (set: 'hottest' | 'mostHumid', conditions: ReturnType<typeof air>) => ({
    place: { ...plantRoom, conditions: { ...plantRoom.conditions, [set]: conditions } },
  });
  it.each([
    ['no layer', attempt({ layers: [] }), 'no layer'],
    ['no temperatures', attempt({ states: [] }), 'no temperatures'],
    ['temperatures that fall', attempt({ states: [{ ...steam, lowest: 180 }] }), 'must rise'],
    ['not a number', attempt({ states: [{ ...steam, highest: NaN }] }), 'states'],
    ['air at 4,000 K', attempt(place('hottest', air(3727))), 'Plant room, hottest: air'],
    ['humidity of 101', attempt(place('mostHumid', air(30, 101))), 'Plant room, mostHumid: humidity'],
    [
      'an inner layer without thickness',
      attempt({ layers: [layer('mf_pipe', null), layer('mf_pipe', 'in:2')] }),
      'inner layer',
    ],
    ['emittance 0', attempt({ finish: { ...finish('std/pvc-jacket'), emittanceAged: 0 } }), 'emittance'],
    [
      'a fluid hotter than any plant',
      attempt({ states: [{ ...steam, highest: 5000 }] }),
      'Plant room, hottest air: operatingTemperature',
    ],
  ])('%s', (_, act, message) => {
    expect(act).toThrow(EngineError);
    expect(act).toThrow(message);
  });
});

describe('a plastic pipe', () => {
  const plastic = { ...steamInput, states: [{ nature: 'hot', operating: 60, lowest: 55, highest: 70 }] as const };
  const heatOf = (input: StudyInput) => {
    const result = study(input);
    return result.candidates[result.specified ?? NaN];
  };

  it('has its own wall counted: less heat than steel of the same diameter, and the wall is no layer', () => {
    const cpvc = heatOf({ ...plastic, body: pipe('cpvc-ips', 'NPS 4') });
    const iron = heatOf(plastic);
    expect(cpvc?.heat.heatFlow).toBeLessThan(iron?.heat.heatFlow ?? NaN);
    expect(cpvc?.heat.interfaces).toHaveLength(2);
    expect(cpvc?.notes.join()).toContain('The wall of the plastic pipe is counted: 6.0 mm');
  });

  it('closes by the two resistances in series', () => {
    const candidate = heatOf({ ...plastic, body: pipe('cpvc-ips', 'NPS 4') });
    const [pipeSurface = NaN] = candidate?.heat.interfaces ?? [];
    const wall = (2 * Math.PI * 0.14 * (60 - pipeSurface)) / Math.log(0.1143 / (0.1143 - 2 * 0.00602));
    expect(wall).toBeCloseTo(candidate?.heat.heatFlow ?? NaN, 6);
  });
});
