import { uncoveredServices, unlimitedPlaces, unlimitedServices, unreadAddenda } from '@/components/job/gaps';
import { firstMissing } from '@/components/job/use-next-step';

import { buildUpInput, placeInput, serviceInput } from '../../support/job-inputs';

const service = (id: string, name: string) => ({ ...serviceInput, id, version: 1, name });
const buildUp = (serviceId: string) => ({ ...buildUpInput(serviceId), id: `of ${serviceId}`, version: 1 });
const place = (name: string, change: object) => ({ ...placeInput, id: name, version: 1, name, ...change });

it('names services that nothing says how to insulate', () => {
  const services = [service('a', 'Steam'), service('b', 'Chilled water'), service('c', 'Supply air')];
  expect(uncoveredServices(services, [buildUp('a')])).toBe(
    'Chilled water and Supply air have neither a specification row nor a build-up: runs of them cannot be judged.',
  );
  expect(uncoveredServices(services, [buildUp('a'), buildUp('b')])).toContain('Supply air has neither');
  expect(uncoveredServices(services, [buildUp('a'), buildUp('b'), buildUp('c')])).toBeNull();
});

it('names services that no limit decides', () => {
  expect(unlimitedServices([{ ...service('a', 'Steam'), limits: [] }])).toContain('Steam: no limit applies');
  expect(unlimitedServices([service('a', 'Steam')])).toBeNull();
});

it('names places within reach that have no touch limit', () => {
  expect(unlimitedPlaces([place('Corridor', { reach: 'trained', touchLimit: null })])).toContain('Corridor');
  expect(unlimitedPlaces([place('Void', { reach: 'nobody', touchLimit: null })])).toBeNull();
});

it('names addenda that are not acknowledged', () => {
  const addendum = (number: number, acknowledged: boolean) => ({
    id: String(number),
    version: 1,
    number,
    date: '2026-11-28',
    changes: '',
    acknowledged,
  });
  expect(unreadAddenda([addendum(1, true), addendum(2, false)])).toBe('Addendum 2 is not acknowledged.');
  expect(unreadAddenda([addendum(1, false), addendum(2, false)])).toBe(
    'Addendum 1 and Addendum 2 are not acknowledged.',
  );
  expect(unreadAddenda([addendum(1, true)])).toBeNull();
});

describe('the next step', () => {
  const section = (title: string, count: number) => ({
    title,
    href: '/jobs' as const,
    add: { label: `Add to ${title}`, href: '/jobs' as const },
    empty: '',
    gap: null,
    items: Array.from({ length: count }, (_, index) => ({
      key: String(index),
      title: '',
      href: '/jobs' as const,
    })),
  });
  const sections = (counts: number[]) =>
    ['Places', 'Services', 'Specification', 'Build-ups', 'Levels'].map((title, index) =>
      section(title, counts[index] ?? 0),
    );

  it('is the first that a run needs and that is not there', () => {
    expect(firstMissing(sections([0, 0, 0, 0, 0]))?.title).toBe('Places');
    expect(firstMissing(sections([1, 1, 0, 0, 0]))?.title).toBe('Specification');
    expect(firstMissing(sections([1, 1, 1, 0, 0]))?.title).toBe('Levels');
  });

  it('asks for no specification where a build-up says how to insulate', () => {
    expect(firstMissing(sections([1, 1, 0, 1, 1]))).toBeUndefined();
  });
});
