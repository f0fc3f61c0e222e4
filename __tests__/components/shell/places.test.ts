import { generalPlaces, isDetail, jobPlaces } from '@/components/shell/places';

const currentAt = (pathname: string) =>
  jobPlaces({ job: '7', pathname, flags: 14 })
    .filter(({ current }) => current)
    .map(({ label }) => label);

it.each([
  ['/jobs/7', 'Overview'],
  ['/jobs/7/runs', 'Runs'],
  ['/jobs/7/runs/30/edit', 'Runs'],
  ['/jobs/7/schedule', 'Schedule'],
  ['/jobs/7/flags', 'Flags'],
  ['/jobs/7/documents', 'Documents'],
  // what has no place of its own belongs to the overview
  ['/jobs/7/places/3', 'Overview'],
  ['/jobs/7/specification', 'Overview'],
])('at %s one place is current: %s', (pathname, label) => {
  expect(currentAt(pathname)).toEqual([label]);
});

it('counts the flags, and only them', () => {
  const counted = jobPlaces({ job: '7', pathname: '/jobs/7', flags: 14 }).filter(({ count }) => count !== undefined);
  expect(counted).toMatchObject([{ label: 'Flags', count: 14 }]);
});

it('calls the list "All jobs" inside of one, where it is not the current place', () => {
  expect(generalPlaces({ pathname: '/jobs/7', inJob: true })[0]).toMatchObject({ label: 'All jobs', current: false });
  expect(generalPlaces({ pathname: '/jobs', inJob: false })[0]).toMatchObject({ label: 'Jobs', current: true });
});

it.each([
  ['/jobs', false],
  ['/jobs/7', false],
  ['/jobs/7/runs', false],
  ['/library', false],
  ['/jobs/7/runs/30', true],
  ['/jobs/7/places/new', true],
  ['/jobs/new', true],
])('%s is a detail with its own way back: %p', (pathname, detail) => {
  expect(isDetail(pathname)).toBe(detail);
});
