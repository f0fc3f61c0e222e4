import type { StudyInput } from '@/api/engine/limits/study-types';
import { study } from '@/api/engine/limits/study';
import { finish, material } from '@/api/engine/standards/library';

import { medianTime } from './median';

/** Median [ms] of one thickness study: two states, two layers, every limit; budget 5 ms. */
export const benchStudy = () => ({ study: medianTime(51, () => study(input)) });

const air = (dryBulb: number, wind = 0) => ({ air: dryBulb, humidity: 75, wind, source: 'invented' });
const input: StudyInput = {
  body: {
    shape: 'pipe',
    standard: 'asme-steel',
    nominal: 'NPS 4',
    outsideDiameter: 0.1143,
    orientation: 'horizontal',
    height: null,
  },
  layers: [
    { material: material('std/mf_pipe'), thickness: 'in:1.5', installed: null },
    { material: material('std/mf_pipe'), thickness: 'in:2', installed: null },
  ],
  finish: finish('std/aluminium-sheet'),
  vapourRetarder: 'mastic-and-mesh',
  states: [
    { nature: 'hot', operating: 82, lowest: 60, highest: 95 },
    { nature: 'cold', operating: 6, lowest: 5, highest: 15 },
  ],
  place: {
    name: 'Roof',
    reach: 'trained',
    touchLimit: 60,
    touchLimitSource: 'invented',
    outdoor: true,
    plenum: false,
    ductLocation: null,
    conditions: { hottest: air(36), mostHumid: air(30), coldest: air(-12, 6), warmest: air(36, 3), mean: air(11, 2) },
  },
  limits: [
    { kind: 'touch' },
    { kind: 'dew-point', margin: 1 },
    { kind: 'energy-code' },
    { kind: 'heat-flow', perLength: 40, flux: null },
    { kind: 'material' },
  ],
  codeEdition: 'ashrae-90.1-2019',
  climateZone: '4A',
  codeExempt: null,
  altitude: 8,
  method: 'astm-c680',
  seriesUnit: 'in',
};
