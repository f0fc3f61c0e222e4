import type { LibraryCurve } from '@/api/contracts/library';
import { conductivityAt, confidenceText, limitsOfUseText, matches } from '@/components/library/library-words';

// Points of the mineral fibre curve: ASHRAE Handbook Fundamentals 2021 ch.23 Table 8.
const curve: LibraryCurve = {
  kind: 'max',
  points: [
    [24, 0.035],
    [93, 0.043],
    [204, 0.061],
  ],
  source: 'Handbook',
  confidence: 'high',
};

describe('a curve', () => {
  it('is read straight between its points', () => {
    expect(conductivityAt(curve, 24)).toBe(0.035);
    expect(conductivityAt(curve, 58.5)).toBeCloseTo(0.039, 10);
    expect(conductivityAt(curve, 204)).toBe(0.061);
  });

  it('says nothing outside of them', () => {
    expect(conductivityAt(curve, 10)).toBeNull();
    expect(conductivityAt(curve, 250)).toBeNull();
  });
});

it('says in plain words how sure a row is', () => {
  expect(confidenceText('high')).toBe('high');
  expect(confidenceText('high (OD), medium-high (walls)')).toBe('high (outside diameter), medium to high (walls)');
  expect(confidenceText('gap (made OD); low-medium (range)')).toBe(
    'nothing found (made outside diameter); low to medium (range)',
  );
});

it('finds every word of a search, in any order and case', () => {
  expect(matches('glass cellular', 'Cellular glass', 'ASTM C552')).toBe(true);
  expect(matches('c552', 'Cellular glass', 'ASTM C552')).toBe(true);
  expect(matches('glass wool', 'Cellular glass', 'ASTM C552')).toBe(false);
  expect(matches('  ', 'Cellular glass')).toBe(true);
});

it('reads limits of use, as far as they are known', () => {
  const material = { ...row, useMinimum: null, useMaximum: 105 };
  expect(limitsOfUseText(material, 'SI')).toBe('up to 105 °C');
  expect(limitsOfUseText({ ...material, useMinimum: -40 }, 'IP')).toBe('−40 °F to 221 °F');
  expect(limitsOfUseText({ ...material, useMaximum: null }, 'SI')).toBe('not stated');
});

const row = {
  id: 'std/elastomeric',
  name: 'Flexible elastomeric closed cell',
  standards: '',
  useType: '',
  curve,
  otherCurves: [],
  useMinimumSource: '',
  useMaximumSource: '',
  closedCell: true,
  flameSmoke: null,
  conductivityTolerance: null,
  series: [],
  notes: [],
};
