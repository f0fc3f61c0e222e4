import type { LibrarySafety } from '@/api/contracts/library';
import type { Place } from '@/api/contracts/place';

export type TouchSuggestion = LibrarySafety['touchDefaults'][number];

const ofReach: Record<Place['reach'], readonly string[]> = {
  nobody: [],
  trained: ['trained-people-plant-rooms', 'staff-areas'],
  public: ['public-reach', 'vulnerable-people'],
};

/** Limits to begin with for who can reach a surface, the usual one first; none where nobody can. */
export function touchSuggestions(reach: Place['reach'], safety: LibrarySafety | undefined): TouchSuggestion[] {
  return ofReach[reach].flatMap((id) => safety?.touchDefaults.find((suggestion) => suggestion.id === id) ?? []);
}

/** Where a suggested limit comes from, within what a place's source may hold. */
export function sourceOf({ basis, source }: TouchSuggestion): string {
  const text = `${basis}; ${source}`;
  return text.length <= 200 ? text : `${text.slice(0, 199).trimEnd()}…`;
}
