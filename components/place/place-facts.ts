import type { PlaceInput } from '@/api/contracts/place';
import type { UnitSystem } from '@/api/contracts/quantities';

import { airText, conditionSetWords, situationText, touchText } from './place-words';

export type PlaceFactsOptions = { units: UnitSystem; ductLocations: readonly { id: string; words: string }[] };

/** All that a place says, as a person reads it: for who only reads, and to set two versions side by side. */
export function placeFacts(place: PlaceInput, { units, ductLocations }: PlaceFactsOptions) {
  const { name, touchLimitSource, ductLocation, note, conditions } = place;
  return [
    { label: 'Name', text: name },
    { label: 'Where', text: situationText(place) },
    { label: 'Who can reach it', text: touchText(place, units) },
    { label: 'Who says so', text: touchLimitSource },
    { label: 'Ducts here', text: ductLocations.find(({ id }) => id === ductLocation)?.words ?? ductLocation ?? '' },
    ...conditionSetWords.map((set) => ({
      label: `${set.title} air`,
      text: `${airText(conditions[set.name], units)} · ${conditions[set.name].source}`,
    })),
    { label: 'Note', text: note },
  ];
}
