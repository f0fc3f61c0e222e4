import {
  bandText,
  layerText,
  materialsText,
  placesText,
  shortName,
  thicknessesText,
} from '@/components/build-up/covering-words';

// NPS and DN of the same size: ASME B36.10M.
const sizes = [
  { dn: 40, nominal: 'NPS 1-1/2', outsideDiameter: 0.0483 },
  { dn: 200, nominal: 'NPS 8', outsideDiameter: 0.2191 },
];
const materials = [
  { id: 'std/mf_pipe', name: 'Mineral fibre pipe section (glass or rock wool)' },
  { id: 'std/cellular_glass', name: 'Cellular glass' },
];
const layer = (materialId: string, thickness: 'in:2' | 'in:1.5' | null) => ({ materialId, thickness, installed: null });
const band = (fromDn: number | null, toDn: number | null) => ({ appliesTo: 'pipe', fromDn, toDn }) as const;

describe('a band of sizes', () => {
  it.each([
    [40, 200, 'SI', 'DN 40 to 200'],
    [40, 200, 'IP', 'NPS 1-1/2 to 8'],
    [40, null, 'SI', 'DN 40 and over'],
    [null, 40, 'IP', 'up to NPS 1-1/2'],
    [40, 40, 'SI', 'DN 40'],
    [null, null, 'SI', 'All pipe sizes'],
    // no NPS is listed for it: its DN stands
    [33, 33, 'IP', 'DN 33'],
  ] as const)('%s to %s in %s reads %s', (...[from, to, units, text]) => {
    expect(bandText(band(from, to), { units, sizes })).toBe(text);
  });
});

describe('layers', () => {
  it('name thickness and material in the units of the reader', () => {
    const inside = layer('std/mf_pipe', 'in:2');
    expect(layerText(inside, { units: 'SI', materials })).toBe('51 mm mineral fibre pipe section');
    expect(layerText(inside, { units: 'IP', materials })).toBe('2 in mineral fibre pipe section');
  });

  it('say what is left to be found', () => {
    expect(thicknessesText([layer('std/mf_pipe', 'in:1.5'), layer('std/mf_pipe', 'in:1.5')], 'SI')).toBe('38 + 38 mm');
    expect(thicknessesText([layer('std/mf_pipe', 'in:1.5'), layer('std/mf_pipe', null)], 'SI')).toBe(
      '38 mm + to be found',
    );
    expect(thicknessesText([layer('std/mf_pipe', null)], 'SI')).toBe('to be found');
  });

  it('name a material once while it repeats', () => {
    const two = [layer('std/mf_pipe', 'in:2'), layer('std/mf_pipe', 'in:2'), layer('std/cellular_glass', 'in:2')];
    expect(materialsText(two, materials)).toBe('Mineral fibre pipe section, then Cellular glass');
  });
});

it('leaves out of a name what stands in brackets', () => {
  expect(shortName('All-service jacket (ASJ), white paper outside')).toBe('All-service jacket, white paper outside');
  expect(shortName('Cellular glass')).toBe('Cellular glass');
});

it('reads no place as everywhere', () => {
  const places = [
    { id: 'a', name: 'Roof' },
    { id: 'b', name: 'Plant room' },
  ];
  expect(placesText([], places)).toBe('Everywhere');
  expect(placesText(['b', 'a'], places)).toBe('Plant room, Roof');
});
