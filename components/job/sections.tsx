import type { Href } from 'expo-router';

import type { Addendum, Drawing, Level } from '@/api/contracts/basis';
import type { BuildUp, SpecificationRow } from '@/api/contracts/build-up';
import type { Place } from '@/api/contracts/place';
import type { Service } from '@/api/contracts/service';
import { inOrderOfServices } from '@/components/build-up/build-up-table';
import { CoveringGlyph } from '@/components/build-up/covering-glyph';
import {
  bandText,
  bodyWords,
  materialsText,
  nameIn,
  placesText,
  shortName,
  thicknessesText,
  type CoveringNames,
} from '@/components/build-up/covering-words';
import { byLabel } from '@/components/specification/row-labels';
import { airText, degreesText, reachWords, situationText } from '@/components/place/place-words';
import { limitsText, operatingText } from '@/components/service/service-words';
import type { ListItem } from '@/components/ui/list-row';

import { dateText } from './due-words';
import { uncoveredServices, unlimitedPlaces, unlimitedServices, unreadAddenda } from './gaps';

/** What a job holds of one kind, as the overview shows it. */
export type JobSection = {
  title: string;
  href: Href;
  add: { label: string; href: Href };
  /** what to say and do where there is none yet */
  empty: string;
  /** what is missing in what is there */
  gap: string | null;
  items: ListItem[];
};

type Noun = 'places' | 'services' | 'build-ups' | 'specification' | 'drawings' | 'addenda' | 'levels';
const at = <At extends Noun>(jobId: string, noun: At) => ({
  href: `/jobs/${jobId}/${noun}` as const,
  one: (id: string) => `/jobs/${jobId}/${noun}/${id}` as const,
});

export function placesSection(jobId: string, places: readonly Place[], { units }: CoveringNames): JobSection {
  const { href, one } = at(jobId, 'places');
  return {
    title: 'Places',
    href,
    add: { label: 'Add a place', href: one('new') },
    empty: 'Say where the runs are, how hot, humid and cold the air gets there, and who can touch them.',
    gap: unlimitedPlaces(places),
    items: places.map((place) => ({
      key: place.id,
      title: place.name,
      text: `${situationText(place)} · ${reachWords[place.reach].toLowerCase()} · humid ${airText(place.conditions.mostHumid, units)}`,
      aside: place.touchLimit && place.reach !== 'nobody' ? degreesText(place.touchLimit.value, units) : '',
      href: one(place.id),
    })),
  };
}

export function servicesSection(jobId: string, services: readonly Service[], names: CoveringNames): JobSection {
  const { href, one } = at(jobId, 'services');
  return {
    title: 'Services',
    href,
    add: { label: 'Add a service', href: one('new') },
    empty: 'Say what is in the pipes and ducts, how hot or cold it gets, and which limits apply.',
    gap: unlimitedServices(services),
    items: services.map((service) => ({
      key: service.id,
      title: service.name,
      text: limitsText(service, names.places, names.units),
      aside: operatingText(service.states, names.units),
      tone: service.states.length === 1 ? service.states[0]?.nature : undefined,
      href: one(service.id),
    })),
  };
}

export function buildUpsSection(jobId: string, rows: readonly BuildUp[], names: CoveringNames): JobSection {
  const { href, one } = at(jobId, 'build-ups');
  return {
    title: 'Build-ups',
    href,
    add: { label: 'Add a build-up', href: one('new') },
    empty: 'Say with what a service is insulated; the study then proposes the thickness where none is specified.',
    gap: null,
    items: inOrderOfServices(rows, names).map((row) => ({
      key: row.id,
      ...coveringItem(row, names),
      href: one(row.id),
    })),
  };
}

type SpecificationRows = {
  specification: readonly SpecificationRow[];
  buildUps: readonly BuildUp[];
  services: readonly Service[];
};

export function specificationSection(jobId: string, rows: SpecificationRows, names: CoveringNames): JobSection {
  const { href, one } = at(jobId, 'specification');
  return {
    title: 'Specification',
    href,
    add: { label: 'Add a row', href: one('new') },
    empty: 'Enter the table as the engineer handed it down: material and thickness by service, size and place.',
    gap: uncoveredServices(rows.services, [...rows.specification, ...rows.buildUps]),
    items: [...rows.specification].sort(byLabel).map((row) => {
      const item = coveringItem(row, names);
      return {
        key: row.id,
        ...item,
        title: `${row.label} · ${item.title}`,
        glyph: <CoveringGlyph row={row} names={names} />,
        href: one(row.id),
      };
    }),
  };
}

function coveringItem(row: BuildUp, names: CoveringNames): Pick<ListItem, 'title' | 'text' | 'aside'> {
  const finish = shortName(nameIn(names.finishes, row.finishId));
  return {
    title: nameIn(names.services, row.serviceId),
    text: `${row.appliesTo === 'pipe' ? bandText(row, names) : bodyWords[row.appliesTo]} · ${placesText(row.placeIds, names.places)} · ${materialsText(row.layers, names.materials)}, ${finish}`,
    aside: row.layers.at(-1)?.thickness === null ? '' : thicknessesText(row.layers, names.units),
  };
}

export function drawingsSection(jobId: string, drawings: readonly Drawing[]): JobSection {
  const { href, one } = at(jobId, 'drawings');
  return {
    title: 'Drawings',
    href,
    add: { label: 'Add a drawing', href: one('new') },
    empty: 'List the drawings that you take off from, each with its revision: the document names them as its basis.',
    gap: null,
    items: drawings.map(({ id, number, title, revision, date, scale }) => ({
      key: id,
      title: title ? `${number} · ${title}` : number,
      text: [date && dateText(date), scale].filter(Boolean).join(' · '),
      aside: revision ? `revision ${revision}` : '',
      href: one(id),
    })),
  };
}

export function addendaSection(jobId: string, addenda: readonly Addendum[]): JobSection {
  const { href, one } = at(jobId, 'addenda');
  return {
    title: 'Addenda',
    href,
    add: { label: 'Add an addendum', href: one('new') },
    empty: 'None so far. Enter each as it comes: what it changes, and that it is acknowledged.',
    gap: unreadAddenda(addenda),
    items: addenda.map(({ id, number, date, changes, acknowledged }) => ({
      key: id,
      title: `Addendum ${number}`,
      text: `${dateText(date)} · ${changes.split('\n')[0]}`,
      aside: acknowledged ? 'acknowledged' : 'not acknowledged',
      href: one(id),
    })),
  };
}

export function levelsSection(jobId: string, levels: readonly Level[]): JobSection {
  const { href, one } = at(jobId, 'levels');
  return {
    title: 'Levels',
    href,
    add: { label: 'Add a level', href: one('new') },
    empty: 'Name the levels or areas in the order in which you take them off; each run lies on one.',
    gap: null,
    items: [...levels]
      .sort((a, b) => a.position - b.position)
      .map(({ id, name }) => ({ key: id, title: name, href: one(id) })),
  };
}
