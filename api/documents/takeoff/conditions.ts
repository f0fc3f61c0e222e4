import type { Place } from '@/api/contracts/place';
import type { Service, ServiceLimit } from '@/api/contracts/service';
import { closePart, gap, openPart, paragraph, subheading } from '@/api/documents/press/flow';
import { styles } from '@/api/documents/press/ink';
import { piece, printTable, stack, text, type Row } from '@/api/documents/press/table';
import { conditionSets, type ConditionSet } from '@/api/engine/limits/study-types';

import { limitText, reachWords, setWords } from './condition-words';
import type { Sheet } from './sheet';

/** Under what every limit was judged: the air of each place with its source, the temperatures of each service. */
export function printConditions(sheet: Sheet): void {
  const { flow, snapshot } = sheet;
  openPart(flow, 'Conditions', 220);
  const words =
    'Touch is judged in the hottest still air at the highest fluid temperature; dew point in the most humid still air at the lowest; the energy code at the operating temperature. Wind is never credited for touch or dew point.';
  paragraph(flow, words, { style: styles.bodySoft });
  subheading(flow, 'Services');
  if (snapshot.services.length > 0) printServices(sheet);
  else paragraph(flow, 'No services are entered.', { style: styles.bodySoft });
  gap(flow, 6);
  subheading(flow, 'Places', { least: 120 });
  if (snapshot.places.length > 0) printPlaces(sheet);
  else paragraph(flow, 'No places are entered.', { style: styles.bodySoft });
  closePart(flow);
}

function printServices({ flow, snapshot, locale }: Sheet): void {
  const placeName = new Map(snapshot.places.map(({ id, name }) => [id, name]));
  const limits = (service: Service) => service.limits.map((limit) => limitIn(limit, { locale, placeName }));
  const rows: Row[] = snapshot.services.map((service) => ({
    cells: [
      stack(piece(service.name, styles.cellStrong), piece(service.fluid, styles.cellSoft), noteOf(service.note)),
      temperatures(service, locale, 'lowest'),
      temperatures(service, locale, 'operating'),
      temperatures(service, locale, 'highest'),
      text(locale.quantity('hours', service.hours.value)),
      stack(
        piece(sentence(limits(service)) || 'none'),
        service.codeExempt ? piece(`Energy code does not apply: ${service.codeExempt}`, styles.cellSoft) : null,
      ),
    ],
  }));
  const right = { align: 'right' as const };
  const columns = [
    { title: 'Service', width: 138 },
    { title: 'lowest °C', width: 50, ...right },
    { title: 'operating °C', width: 58, ...right },
    { title: 'highest °C', width: 50, ...right },
    { title: 'h/year', width: 36, ...right },
    { title: 'Limits that apply' },
  ];
  printTable(flow, { caption: 'Services', columns, rows });
}

type InWords = { locale: Sheet['locale']; placeName: Map<string, string> };
function limitIn(limit: ServiceLimit, { locale, placeName }: InWords): string {
  const only = limit.placeId === null ? '' : ` (${placeName.get(limit.placeId) ?? 'one place'} only)`;
  return `${limitText(limit, locale)}${only}`;
}

const sentence = (words: string[]) => words.join(', ');
const noteOf = (note: string) => (note ? piece(note, styles.cellSoft) : null);

type Which = 'lowest' | 'operating' | 'highest';
const temperatures = ({ states }: Service, locale: Sheet['locale'], which: Which) =>
  stack(...states.map((state) => piece(locale.quantity('temperature', state[which].value))));

function printPlaces({ flow, snapshot, locale }: Sheet): void {
  const right = { align: 'right' as const };
  const columns = [
    { title: 'Condition', width: 150 },
    { title: 'air °C', width: 44, ...right },
    { title: 'humidity %', width: 56, ...right },
    { title: 'wind m/s', width: 48, ...right },
    { title: 'Source' },
  ];
  const rows = snapshot.places.flatMap((place) => [
    headingOf(place, locale),
    ...conditionSets.map((set) => conditionRow(place, set, locale)),
  ]);
  printTable(flow, { caption: 'Conditions by place', padding: 2.5, columns, rows });
}

function headingOf(place: Place, locale: Sheet['locale']): Row {
  const limit = place.touchLimit
    ? `touch limit ${locale.withUnit('temperature', place.touchLimit.value)}`
    : 'no touch limit';
  const source = place.touchLimit && place.touchLimitSource ? ` (${place.touchLimitSource})` : '';
  const kind = [
    place.outdoor ? 'outdoors' : '',
    place.plenum ? 'return-air plenum' : '',
    place.ductLocation ? `ducts: ${place.ductLocation.replaceAll('_', ' ')}` : '',
  ];
  const words = [`${reachWords[place.reach]}, ${limit}${source}`, ...kind].filter((part) => part !== '').join(' · ');
  return {
    kind: 'heading',
    cells: [stack(piece(place.name, styles.cellStrong), piece(words, styles.cellSoft), noteOf(place.note))],
  };
}

function conditionRow({ conditions }: Place, set: ConditionSet, locale: Sheet['locale']): Row {
  const { air, humidity, wind, source } = conditions[set];
  return {
    keep: set !== 'mean',
    cells: [
      text(setWords[set]),
      text(locale.quantity('temperature', air.value)),
      text(humidity === null ? '–' : locale.quantity('humidity', humidity.value)),
      text(locale.quantity('speed', wind.value)),
      text(source, styles.cellSoft),
    ],
  };
}
