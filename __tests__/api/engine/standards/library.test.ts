import { codeEditions, ductExemptions, ductLocations, findCodeEdition } from '@/api/engine/standards/energy-codes';
import { finishes, findFinish } from '@/api/engine/standards/finishes';
import { finish, material } from '@/api/engine/standards/library';
import { findMaterial, materials } from '@/api/engine/standards/materials';
import { findPipeSize, pipeSizes, pipeStandardTitle } from '@/api/engine/standards/pipe-sizes';
import { oneOf } from '@/api/engine/standards/reading';
import { pipeStandards, vapourRetarders } from '@/api/engine/standards/rows';
import { isThicknessName } from '@/api/engine/standards/thickness-name';
import { findSeries, isMadeFor, thicknessSeries } from '@/api/engine/standards/thickness-series';
import {
  touchDefaults,
  touchNotes,
  touchThresholds,
  touchThresholdsOrigin,
} from '@/api/engine/standards/touch-defaults';
import { vapourRetarderNames } from '@/api/engine/standards/vapour-retarders';

const rising = (values: readonly number[]) => values.every((value, at) => at === 0 || value > (values[at - 1] ?? NaN));

describe('pipes and tubes', () => {
  it('have every standard, each size once, with its origin', () => {
    expect(new Set(pipeSizes().map(({ standard }) => standard))).toEqual(new Set(pipeStandards));
    expect(new Set(pipeSizes().map(({ standard, nominal }) => `${standard} ${nominal}`)).size).toBe(pipeSizes().length);
    for (const { source, confidence } of pipeSizes()) expect([source, confidence].every(Boolean)).toBe(true);
    for (const standard of pipeStandards) expect(pipeStandardTitle(standard)).not.toBe('');
  });

  it('grow with their nominal, and keep their walls inside', () => {
    for (const standard of pipeStandards) {
      const sizes = pipeSizes().filter((size) => size.standard === standard);
      expect(rising(sizes.map(({ outsideDiameter }) => outsideDiameter))).toBe(true);
      for (const { outsideDiameter, walls } of sizes) {
        for (const { thickness } of walls) expect(2 * thickness).toBeLessThan(outsideDiameter);
      }
    }
  });

  // ASME B36.10M, EN 10255, ASTM B88: outside diameters as printed in the standards (from memory, all well known)
  it.each([
    ['asme-steel', 'NPS 2', 0.0603],
    ['asme-steel', 'NPS 2-1/2', 0.073],
    ['en-10255', 'DN 65', 0.0761],
    ['asme-steel', 'NPS 6', 0.1683],
    ['en-10255', 'DN 150', 0.1651],
    ['astm-copper', '2 in', 0.05397],
    ['en-1057', '54 mm', 0.054],
  ] as const)('are a standard and a nominal: %s %s', (standard, nominal, outsideDiameter) => {
    expect(findPipeSize(standard, nominal)?.outsideDiameter).toBe(outsideDiameter);
  });

  it('know no size of another standard', () => expect(findPipeSize('asme-steel', 'DN 65')).toBeUndefined());
});

describe('materials', () => {
  it('have one curve in use, all curves with rising temperatures and credible values', () => {
    for (const row of materials()) {
      for (const { points, source } of [row.curve, ...row.otherCurves]) {
        expect(points.length).toBeGreaterThan(0);
        expect(rising(points.map(([temperature]) => temperature))).toBe(true);
        for (const [, conductivity] of points) {
          expect(conductivity).toBeGreaterThan(0.008);
          expect(conductivity).toBeLessThan(0.45);
        }
        expect(source).not.toBe('');
      }
    }
  });

  it('name the series that they are made in', () => {
    for (const { series } of materials()) for (const id of series) expect(findSeries(id)?.id).toBe(id);
  });

  it('have use limits with their source, or say that these are not known', () => {
    for (const row of materials()) {
      expect(row.useMinimumSource).not.toBe('');
      expect(row.useMaximumSource).not.toBe('');
      if (row.useMinimum !== null && row.useMaximum !== null) expect(row.useMinimum).toBeLessThan(row.useMaximum);
    }
  });

  it('keep what ASHRAE Handbook Fundamentals 2021 (SI) ch. 23 Table 8 prints for mineral fibre pipe insulation', () => {
    expect(findMaterial('mf_pipe')?.curve.points).toEqual([
      [-4, 0.034],
      [24, 0.035],
      [93, 0.043],
      [204, 0.061],
      [316, 0.091],
    ]);
  });

  it('are found by library id, and no other', () => {
    expect(material('std/mf_pipe').id).toBe('mf_pipe');
    expect(() => material('mf_pipe')).toThrow('The library has no material mf_pipe');
    expect(() => material('std/granite')).toThrow('std/granite');
  });
});

describe('finishes', () => {
  it('are as new no brighter than their range and aged no darker', () => {
    for (const { emittanceNew, emittanceAged, emittanceRange } of finishes()) {
      expect(emittanceNew).toBeLessThanOrEqual(emittanceAged);
      expect(emittanceNew).toBeGreaterThanOrEqual(emittanceRange[0]);
      expect(emittanceAged).toBeLessThanOrEqual(emittanceRange[1]);
      expect(emittanceRange[0]).toBeGreaterThan(0);
      expect(emittanceRange[1]).toBeLessThanOrEqual(1);
    }
  });

  // ASHRAE Handbook Fundamentals 2021 (SI) ch. 23 Table 12
  it('have the emittances that are printed', () => {
    expect(findFinish('aluminium-sheet')?.emittanceNew).toBe(0.1);
    expect(findFinish('all-service-jacket')?.emittanceNew).toBe(0.9);
    expect(findFinish('stainless-steel')?.emittanceAged).toBe(0.32);
  });

  it('are found by library id, and no other', () => {
    expect(finish('std/pvc-jacket').maximum).toBe(60);
    expect(() => finish('std/velvet')).toThrow('The library has no finish std/velvet');
  });
});

describe('made series', () => {
  it('name their thicknesses, thin to thick', () => {
    for (const { names } of thicknessSeries()) {
      expect(names.every(isThicknessName)).toBe(true);
      expect(rising(names.map((name) => Number(name.slice(3))))).toBe(true);
    }
  });

  it('make two-inch foam tube from 22 mm of tube up, from memory of commercial practice', () => {
    const series = findSeries('inch-flexible-closed-cell-tube');
    expect(series && isMadeFor(series, 'in:2', 0.0159)).toBe(false);
    expect(series && isMadeFor(series, 'in:2', 0.0603)).toBe(true);
  });

  it('compress wrap only', () => {
    const pressed = thicknessSeries().filter(({ installed }) => installed !== null);
    expect(pressed.map(({ id }) => id)).toEqual(['inch-duct-wrap', 'metric-duct-wrap']);
  });
});

describe('energy codes', () => {
  it('are the editions whose tables are entered', () => {
    expect(codeEditions().map(({ id }) => id)).toEqual([
      'ashrae-90.1-2019',
      'ashrae-90.1-2016',
      'ashrae-90.1-2013',
      'ashrae-90.1-2010',
      'iecc-2021',
      'iecc-2018',
      'title-24-2022',
    ]);
  });

  it('ask for no less on larger pipe of one band, in five columns', () => {
    for (const { pipes } of codeEditions()) {
      expect(pipes.bands).toHaveLength(7);
      for (const { thicknesses, conductivity } of pipes.bands) {
        expect(thicknesses).toHaveLength(5);
        expect([...thicknesses].sort((one, other) => one - other)).toEqual(thicknesses);
        expect(conductivity[0]).toBeLessThan(conductivity[1]);
      }
    }
  });

  it('put the upper end of the range into the adjustment, Title 24 the lower', () => {
    expect(findCodeEdition('iecc-2021')?.end).toBe('upper');
    expect(findCodeEdition('title-24-2022')?.end).toBe('lower');
  });

  it('have an R for each zone and location of a duct table', () => {
    for (const { ducts } of codeEditions()) {
      for (const rows of Object.values(ducts?.values ?? {})) {
        for (const { R } of rows) expect(R).toHaveLength(ducts?.locations.length ?? NaN);
      }
    }
    expect(ductLocations('ashrae-90.1-2019').map(({ id }) => id)).toEqual([
      'exterior',
      'unconditioned_space_and_buried',
      'indirectly_conditioned',
    ]);
    expect(ductLocations('title-24-2022')).toEqual([]);
  });

  it('list their exemptions with answer and source', () => {
    const all = [...codeEditions().flatMap(({ exemptions }) => exemptions), ...ductExemptions()];
    for (const { what, answer, source } of all) expect([what, answer, source].every(Boolean)).toBe(true);
  });
});

describe('safety', () => {
  it('starts touch limits from published figures', () => {
    expect(touchDefaults().map(({ id, limit }) => [id, limit])).toEqual([
      ['trained-people-plant-rooms', 60],
      ['staff-areas', 55],
      ['public-reach', 50],
      ['vulnerable-people', 43],
    ]);
    expect(touchThresholds().find(({ contact }) => contact === '8 h and longer')?.limit).toBe(43);
    expect(touchThresholdsOrigin.source).toContain('ISO 13732-1');
    expect(touchNotes().length).toBeGreaterThan(0);
  });

  it('names every vapour retarder', () =>
    expect(Object.keys(vapourRetarderNames).sort()).toEqual([...vapourRetarders].sort()));
});

it('a word that a list does not know fails', () => {
  expect(() => oneOf(['upper', 'lower'], 'middle')).toThrow('A table says middle; known are upper, lower');
});
