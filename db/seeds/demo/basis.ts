import type { AddendumInput, DrawingInput, LevelInput } from '@/api/contracts/basis';
import type { JobInput } from '@/api/contracts/job';

import { typed } from './typed';

export const demoZone = 'Europe/Dublin';
/** Days from the day of seeding, in the job's zone. */
export const demoDays = { drawings: -24, revisionA: -5, addendum: -3, bidInRevisionA: 0, bid: 2 };
export const demoTimes = { revisionA: '15:40', bid: '14:00' };

export const demoJob: Omit<JobInput, 'contactIds' | 'bidDue'> = {
  number: 'BLI-0417',
  name: 'St Ellowyn Cottage Hospital, plant and ward retrofit',
  site: 'Port Harrowmere (fictional)',
  scope:
    'Insulate new and re-piped steam, condensate, heating, domestic and chilled water, refrigerant suction and air ductwork in three phases while the wards stay open.\nPhase 1 wards (nights), phase 2 plant room, phase 3 tunnel and roof.',
  currency: 'EUR',
  codeEdition: 'ashrae-90.1-2019',
  climateZone: '4A',
  altitude: typed('altitude', '8 m'),
  documentUnits: 'SI',
  seriesUnit: 'in',
  surfaceMethod: 'astm-c680',
  specification: { number: '23 07 00', title: '', revision: 'issue for bid', date: null },
};

export const demoLevels = {
  '1': { name: 'Level 1, ward ceilings', position: 1 },
  '2': { name: 'Level 2, plant room', position: 2 },
  '3': { name: 'Level 3, tunnel, roof and crawl space', position: 3 },
} as const satisfies Record<string, LevelInput>;
export type LevelKey = keyof typeof demoLevels;

const drawing = (title: string, scale: string, revision: string) => ({ title, scale, revision });
export const demoDrawings = {
  'M-201': drawing('Level 1 plumbing', '1:100', '2'),
  'M-202': drawing('Level 1 heating and ductwork', '1:100', '2'),
  'M-203': drawing('Corridor heating', '1:50', '1'),
  'M-301': drawing('Plant room heating', '1:50', '3'),
  'M-302': drawing('Plant room steam', '1:50', '3'),
  'M-303': drawing('Chilled water', '1:100', '2'),
  'M-304': drawing('Laundry', '1:50', '1'),
  'M-401': drawing('Service tunnel', '1:200', '1'),
  'M-402': drawing('Roof', '1:100', '2'),
  'M-403': drawing('Refrigerant', 'not to scale', '1'),
  'M-404': drawing('Crawl space', '1:100', '1'),
  'M-405': drawing('Plant room high level', '1:50', '1'),
} as const satisfies Record<string, Omit<DrawingInput, 'number' | 'date'>>;
export type DrawingKey = keyof typeof demoDrawings;

export const demoAddendum: Omit<AddendumInput, 'date'> = {
  number: 1,
  changes: [
    'Outdoor chilled-water finish changed from bright to white-painted aluminium (R32, R33)',
    'R34 added: DN 100 chilled water to the new roof unit, 76 mm in two layers',
    'Bid moved by two days',
  ].join('\n'),
  acknowledged: true,
};
