import { usesOf } from '@/components/job/uses';

const limit = { kind: 'touch', placeId: 'roof' } as const;
const service = {
  id: 'steam',
  version: 1,
  name: 'Steam',
  fluid: 'steam',
  states: [],
  hours: { value: 8000 },
  codeExempt: '',
  limits: [limit],
  note: '',
  position: 0,
};

it('names what stands on a place', () => {
  expect(usesOf({ services: [service] }, { by: 'placeId', id: 'roof' })).toEqual([
    '1 service with a limit for it: Steam',
  ]);
  expect(usesOf({ services: [service] }, { by: 'placeId', id: 'tunnel' })).toEqual([]);
});

it('counts build-ups and names specification rows of a service', () => {
  const row = {
    id: 'row',
    version: 1,
    serviceId: 'steam',
    appliesTo: 'pipe' as const,
    placeIds: ['roof'],
    fromDn: null,
    toDn: null,
    layers: [],
    finishId: 'std/pvc-jacket',
    vapourRetarder: 'none' as const,
    note: '',
  };
  const rows = { buildUps: [row, row], specification: [{ ...row, label: 'P01' }] };
  expect(usesOf(rows, { by: 'serviceId', id: 'steam' })).toEqual(['1 specification row: P01', '2 build-ups']);
  expect(usesOf(rows, { by: 'placeId', id: 'roof' })).toEqual(['1 specification row: P01', '2 build-ups']);
  expect(usesOf(rows, { by: 'levelId', id: 'roof' })).toEqual([]);
});
