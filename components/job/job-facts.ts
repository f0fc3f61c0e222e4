import type { Contact } from '@/api/contracts/contact';
import type { JobInput } from '@/api/contracts/job';
import { showWithUnit, type UnitSystem } from '@/api/contracts/quantities';

import { dateText, dueShort, zoneText } from './due-words';

export type JobFactsOptions = {
  units: UnitSystem;
  contacts: readonly Contact[];
  codes: readonly { id: string; title: string }[];
};

export const methodWords: Record<JobInput['surfaceMethod'], string> = {
  'astm-c680': 'ASTM C680 practice',
  'iso-12241': 'ISO 12241',
};
export const seriesWords: Record<JobInput['seriesUnit'], string> = { in: 'Inch series', mm: 'Metric series' };

/** All that a job says about itself, as a person reads it. */
export function jobFacts(job: JobInput, { units, contacts, codes }: JobFactsOptions) {
  const { bidDue, specification } = job;
  const named = contacts.filter(({ id }) => job.contactIds.includes(id)).map(contactText);
  return [
    { term: 'Number', value: job.number },
    { term: 'Name', value: job.name },
    { term: 'Site', value: job.site },
    { term: 'Bid due', value: bidDue ? `${dueShort(bidDue)}, ${zoneText(bidDue.zone)}` : '' },
    { term: 'Client', value: named.join('\n') },
    { term: 'Scope', value: job.scope },
    { term: 'Specification', value: specificationText(specification) },
    { term: 'Code edition', value: codes.find(({ id }) => id === job.codeEdition)?.title ?? job.codeEdition },
    { term: 'Climate zone', value: job.climateZone },
    { term: 'Above sea level', value: showWithUnit('altitude', job.altitude.value, { units }) },
    { term: 'Thicknesses', value: seriesWords[job.seriesUnit] },
    { term: 'Surface by', value: methodWords[job.surfaceMethod] },
    { term: 'Currency', value: job.currency },
  ];
}

export const contactText = ({ name, company }: Pick<Contact, 'name' | 'company'>): string =>
  company ? `${name}, ${company}` : name;

function specificationText({ number, title, revision, date }: JobInput['specification']): string {
  return [number, title, revision, date && dateText(date)].filter(Boolean).join(', ');
}
