import type { Href } from 'expo-router';

import type { Place } from './nav-item';

/** One place of a job: under its address all that belongs to it. */
type JobPlace = { label: string; href: Href & string; counted?: boolean };

const placesOf = (job: string): JobPlace[] => [
  { label: 'Overview', href: `/jobs/${job}` },
  { label: 'Runs', href: `/jobs/${job}/runs` },
  { label: 'Schedule', href: `/jobs/${job}/schedule` },
  { label: 'Flags', href: `/jobs/${job}/flags`, counted: true },
  { label: 'Documents', href: `/jobs/${job}/documents` },
];

const isAt = (pathname: string, href: string) => pathname === href || pathname.startsWith(`${href}/`);

/** The places of a job. What is in none of the others (its places, services, specification) belongs to the overview. */
export function jobPlaces({ job, pathname, flags }: { job: string; pathname: string; flags?: number }): Place[] {
  const [overview, ...others] = placesOf(job);
  const inOther = others.some(({ href }) => isAt(pathname, href));
  return [overview, ...others]
    .filter((place) => place !== undefined)
    .map((place) => ({
      label: place.label,
      href: place.href,
      current: place === overview ? !inOther : isAt(pathname, place.href),
      count: place.counted ? flags : undefined,
    }));
}

/** The places outside of any job. */
export const generalPlaces = ({ pathname, inJob }: { pathname: string; inJob: boolean }): Place[] => [
  { label: inJob ? 'All jobs' : 'Jobs', href: '/jobs', current: !inJob && isAt(pathname, '/jobs') },
  { label: 'Contacts', href: '/contacts', current: isAt(pathname, '/contacts') },
  { label: 'Library', href: '/library', current: isAt(pathname, '/library') },
];

/** A detail below a place has its own way back and its own foot: there a phone needs no bar. */
export const isDetail = (pathname: string) =>
  /^\/(jobs\/[^/]+\/[^/]+\/.+|jobs\/[^/]+\/edit|library\/.+\/.+|contacts\/.+|jobs\/new)$/.test(pathname);
