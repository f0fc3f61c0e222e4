import type { Addendum } from '@/api/contracts/basis';
import type { BuildUp, SpecificationRow } from '@/api/contracts/build-up';
import type { Place } from '@/api/contracts/place';
import type { Service } from '@/api/contracts/service';

import { listText } from './standing';

/** Services that nothing says how to insulate: their runs can be taken off, but not judged. */
export function uncoveredServices(
  services: readonly Service[],
  rows: readonly (BuildUp | SpecificationRow)[],
): string | null {
  const covered = new Set(rows.map(({ serviceId }) => serviceId));
  const names = services.filter(({ id }) => !covered.has(id)).map(({ name }) => name);
  if (names.length === 0) return null;
  const has = names.length === 1 ? 'has' : 'have';
  return `${listText(names)} ${has} neither a specification row nor a build-up: runs of ${names.length === 1 ? 'it' : 'them'} cannot be judged.`;
}

/** Services whose thickness nobody hands down and nobody may propose. */
export function unlimitedServices(services: readonly Service[]): string | null {
  const names = services.filter(({ limits }) => limits.length === 0).map(({ name }) => name);
  return names.length === 0 ? null : `${listText(names)}: no limit applies, so nothing decides a thickness.`;
}

export function unlimitedPlaces(places: readonly Place[]): string | null {
  const names = places.filter(({ reach, touchLimit }) => reach !== 'nobody' && !touchLimit).map(({ name }) => name);
  return names.length === 0 ? null : `${listText(names)}: within reach, but without a touch limit.`;
}

export function unreadAddenda(addenda: readonly Addendum[]): string | null {
  const numbers = addenda.filter(({ acknowledged }) => !acknowledged).map(({ number }) => `Addendum ${number}`);
  if (numbers.length === 0) return null;
  return `${listText(numbers)} ${numbers.length === 1 ? 'is' : 'are'} not acknowledged.`;
}
