import type { Snapshot } from '@/api/contracts/revision';
import { engineVersion } from '@/api/engine/version';

import { idOf, places, services } from './snapshot-parts';

/** What surrounds the runs of the invented job. */
export const frame: Omit<Snapshot, 'runs' | 'judged' | 'flags' | 'schedule' | 'takeoff'> = {
  format: 1,
  letter: 'B',
  frozenAt: '2026-03-12T15:40:00.000Z',
  validUntil: '2026-04-26',
  timeZone: 'Europe/Dublin',
  preparedBy: { name: 'Nerys Thornquill', email: 'nerys@tidewrack.example' },
  letterhead: {
    name: 'Tidewrack Insulation',
    town: 'Saltern Quay',
    address: 'Ropewalk 4, Saltern Quay',
    email: 'records@tidewrack.example',
    phone: '+353 1 555 0142',
    locale: 'en-IE',
    currency: 'EUR',
  },
  to: [
    { name: 'Wim Oosterdale', company: 'Oosterdale Mechanical', email: 'wim@oosterdale.example' },
    { name: 'Petra Lindqvist-Amaral', company: 'Harbour Leisure Trust', email: 'petra@harbour.example' },
  ],
  job: {
    id: idOf(1),
    version: 3,
    number: 'TW-0231',
    name: 'Saltern Quay swimming pool, plant renewal',
    site: 'Harbour Road, Saltern Quay',
    scope:
      'Insulate the new heating, hot-water and chilled-water pipes and the supply ducts of the pool hall and its plant room, while the small pool stays open.',
    contactIds: [],
    bidDue: { date: '2026-03-14', time: '14:00', zone: 'Europe/Dublin' },
    currency: 'EUR',
    codeEdition: 'ASHRAE 90.1-2019',
    climateZone: '4A',
    altitude: { value: 12 },
    documentUnits: 'SI',
    seriesUnit: 'in',
    surfaceMethod: 'astm-c680',
    specification: {
      number: '23 07 00',
      title: 'Insulation of pipes, ducts and equipment',
      revision: 'issue for bid',
      date: '2026-01-09',
    },
  },
  levels: [
    { id: idOf(301), version: 1, name: 'Basement', position: 0 },
    { id: idOf(302), version: 1, name: 'Roof', position: 1 },
  ],
  drawings: ['Plant room', 'Changing rooms', 'Roof'].map((title, index) => ({
    id: idOf(401 + index),
    version: 1,
    number: `M-1${index + 1}`,
    title,
    revision: 'P3',
    date: '2026-02-18',
    scale: '1:50',
  })),
  addenda: [
    {
      id: idOf(501),
      version: 1,
      number: 1,
      date: '2026-03-09',
      changes: 'Roof pipes finished in white-painted aluminium, not bright.\nBid moved by two days.',
      acknowledged: true,
    },
  ],
  places,
  services,
  cautions: [
    'Calculated surface temperatures are estimates for steady conditions. Touch limits and code minimums defer to the local code and the authority having jurisdiction; where the law asks for it, a licensed professional confirms the choice.',
    'Hot surfaces: isolate, lock out and allow to cool before touching. Do not rely on an infrared reading from bright metal.',
  ],
  standards: [
    {
      id: 'std/mineral-fibre-pipe',
      kind: 'material',
      name: 'Mineral fibre pipe section',
      detail: '0.035 W/(m·K) at 24 °C, specification maximum',
      source: 'ASTM C547',
      confidence: 'high',
    },
    {
      id: 'asme-steel/80',
      kind: 'pipe',
      name: 'DN 80 steel',
      detail: 'Outside diameter 88.9 mm',
      source: 'ASME B36.10M',
      confidence: 'high',
    },
    {
      id: '90.1-2019',
      kind: 'code',
      name: 'ASHRAE 90.1-2019',
      detail: 'Table 6.8.3-1',
      source: 'ASHRAE 90.1-2019',
      confidence: 'medium',
    },
  ],
  engineVersion,
  method: 'astm-c680',
};
