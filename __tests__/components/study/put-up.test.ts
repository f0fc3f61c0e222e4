import { choicesOf, firstSelected } from '@/components/study/choices';
import { leadAndRest } from '@/components/study/lead';
import { asSpecified, departure, finishChoice, layersAt, thicknessAsSpecified } from '@/components/study/override';
import { rowOf, standingOf } from '@/components/study/put-up';

import { hotSteam, steamRow, steamRun, steamStudy } from '../../support/run-study';

describe('the three thicknesses', () => {
  it('are kept apart: the row has 76 mm, 38 mm was chosen, 114 mm is proposed', () => {
    const row = rowOf(steamStudy, [steamRow], steamRun.serviceId);
    expect(standingOf(steamStudy, row)).toEqual({ specified: 4, chosen: 2, proposed: 6 });
  });

  it('without an override the thickness that is named is the specified one', () => {
    const specified = { ...steamStudy, assembly: { ...steamStudy.assembly, source: 'specified' as const } };
    expect(standingOf(specified, steamRow)).toEqual({ specified: 2, chosen: null, proposed: 6 });
  });

  it('a row of another material or another number of layers is not found among these thicknesses', () => {
    const twoLayers = { ...steamRow, layers: [...steamRow.layers, ...steamRow.layers] };
    expect(standingOf(steamStudy, twoLayers).specified).toBeNull();
  });
});

describe('what can be decided', () => {
  const standing = { specified: 4, chosen: 2, proposed: 6 };
  const of = { runStudy: hotSteam, row: steamRow };

  it('offers what meets all as the thing to do, and to keep what falls short', () => {
    expect(choicesOf(of, standing, 6)).toEqual({
      use: { place: 6, asSpecified: false, isDue: true },
      keep: 2,
      back: true,
    });
  });

  it('does not push what falls short itself, and knows the specified one', () => {
    expect(choicesOf(of, standing, 4).use).toEqual({ place: 4, asSpecified: true, isDue: false });
  });

  it('neither puts up nothing at all nor what is up already', () => {
    expect(choicesOf(of, standing, 0).use).toBeNull();
    expect(choicesOf(of, standing, 2).use).toBeNull();
  });

  it('begins at what is proposed while what is up falls short', () => {
    expect(firstSelected(steamStudy)).toBe(6);
    expect(firstSelected({ ...steamStudy, used: 6 })).toBe(6);
    expect(firstSelected({ ...steamStudy, used: null, study: { ...steamStudy.study, proposed: null } })).toBe(6);
  });
});

describe('an override', () => {
  it('changes the outermost thickness and keeps the rest of the run’s departures', () => {
    const layers = layersAt(steamStudy, steamStudy.study.candidates[6]!, steamRun.override!.layers!);
    expect(layers).toEqual([{ materialId: 'std/mf_pipe', thickness: 'in:4.5', installed: null }]);
    const painted = { ...steamRun, override: { ...steamRun.override!, finishId: 'std/painted-metal' } };
    expect(departure(painted, { layers, reason: 'Code' })).toMatchObject({
      layers,
      finishId: 'std/painted-metal',
      reason: 'Code',
    });
  });

  it('keeps a wrap’s thickness as put up only where its thickness is the same', () => {
    const known = [{ materialId: 'std/mf_pipe', thickness: 'in:1.5' as const, installed: { value: 0.03 } }];
    expect(layersAt(steamStudy, steamStudy.study.candidates[2]!, known)[0]!.installed).toEqual({ value: 0.03 });
    expect(layersAt(steamStudy, steamStudy.study.candidates[6]!, known)[0]!.installed).toBeNull();
  });

  it('goes away when nothing is left of it, and keeps a state or an exemption of the run’s own', () => {
    expect(asSpecified(steamRun)).toBeNull();
    expect(thicknessAsSpecified(steamRun)).toBeNull();
    const exempt = { ...steamRun, override: { ...steamRun.override!, codeExempt: 'Between valve and coil' } };
    expect(asSpecified(exempt)).toMatchObject({ layers: null, codeExempt: 'Between valve and coil' });
    const painted = { ...steamRun, override: { ...steamRun.override!, finishId: 'std/painted-metal' } };
    expect(thicknessAsSpecified(painted)).toMatchObject({ layers: null, finishId: 'std/painted-metal' });
  });

  it('does not name the finish that the row names', () => {
    expect(finishChoice('std/aluminium-sheet', steamRow)).toBeNull();
    expect(finishChoice('std/painted-metal', steamRow)).toBe('std/painted-metal');
  });
});

it.each([
  ['38 mm is not enough. It would reach 63.0 °C.', '38 mm is not enough.'],
  ['114 mm meets every limit; the energy code governs: 102 mm falls short.', '114 mm meets every limit'],
  ['Nothing made meets the dew point: even 102 mm would sweat.', 'Nothing made meets the dew point'],
  ['All is well', 'All is well'],
])('leads with the first statement of %s', (text, lead) => {
  expect(leadAndRest(text)[0]).toBe(lead);
  expect(leadAndRest(text).join('')).toBe(text);
});
