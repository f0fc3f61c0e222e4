import type { PlaceInput } from '@/api/contracts/place';
import type { UnitSystem } from '@/api/contracts/quantities';

import { airText, conditionSetWords, situationText, touchText } from './place-words';

export type PlaceFactsOptions = { units: UnitSystem; ductLocations: readonly { id: string; words: string }[] };

/** All that a place says, as a person reads it: for who only reads, and to set two versions side by side. */
export function placeFacts(place: PlaceInput, { units, ductLocations }: PlaceFactsOptions) {
  const { name, touchLimitSource, ductLocation, note, conditions } = place;
  return [
    { term: 'Name', value: name },
    { term: 'Where', value: situationText(place) },
    { term: 'Who can reach it', value: touchText(place, units) },
    { term: 'Who says so', value: touchLimitSource },
    { term: 'Ducts here', value: ductLocations.find(({ id }) => id === ductLocation)?.words ?? ductLocation ?? '' },
    ...conditionSetWords.map((set) => ({
      term: `${set.title} air`,
      value: `${airText(conditions[set.name], units)} · ${conditions[set.name].source}`,
    })),
    { term: 'Note', value: note },
  ];
}
