import { nextPlace } from '@/components/session/next-place';

it.each(['/jobs', '/jobs/7/runs?service=steam', '/library/materials/std%2Fmineral-fibre-pipe'])(
  'goes on to %s',
  (place) => {
    expect(nextPlace(place)).toBe(place);
  },
);

// an address in a link must not lead from our sign-in page to another site's
it.each([
  '//evil.example',
  '/\\evil.example',
  'https://evil.example',
  'javascript:alert(1)',
  '',
  undefined,
  ['/jobs', '/x'],
  '/sign-in?next=/jobs',
])('goes to the jobs instead of %p', (place) => {
  expect(nextPlace(place)).toBe('/jobs');
});
