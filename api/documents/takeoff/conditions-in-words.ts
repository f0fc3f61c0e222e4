import type { LinkView } from '@/api/contracts/link';
import type { Place } from '@/api/contracts/place';
import type { Snapshot } from '@/api/contracts/revision';
import { createLocale, type Locale } from '@/api/documents/locale';
import { conditionSets, type ConditionSet } from '@/api/engine/limits/study-types';

import { reachWords, setWords } from './condition-words';

type Conditions = NonNullable<LinkView['sent']>['conditions'];

/** The conditions of each place as sentences, for a reader without the document's table. */
export function conditionsInWords({
  places,
  letterhead,
  timeZone,
}: Pick<Snapshot, 'places' | 'letterhead' | 'timeZone'>): Conditions {
  const locale = createLocale(letterhead.locale, timeZone);
  return places.map((place) => ({
    place: place.name,
    words: [standing(place, locale), ...conditionSets.map((set) => airWords(place, set, locale))],
  }));
}

function standing({ reach, touchLimit, touchLimitSource, outdoor, plenum }: Place, locale: Locale): string {
  const limit = touchLimit
    ? `touch limit ${locale.withUnit('temperature', touchLimit.value)}${touchLimitSource ? ` (${touchLimitSource})` : ''}`
    : 'no touch limit';
  const where = [outdoor ? 'outdoors' : '', plenum ? 'return-air plenum' : ''].filter((word) => word !== '');
  return [`${capital(reachWords[reach])}`, limit, ...where].join(', ');
}

function airWords({ conditions }: Place, set: ConditionSet, locale: Locale): string {
  const { air, humidity, wind, source } = conditions[set];
  const parts = [
    locale.withUnit('temperature', air.value),
    humidity && locale.withUnit('humidity', humidity.value),
    wind.value > 0 && `wind ${locale.withUnit('speed', wind.value)}`,
  ];
  return `${setWords[set]}: ${parts.filter(Boolean).join(', ')} (${source})`;
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);
