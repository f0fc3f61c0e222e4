import type { UnitSystem } from '@/api/contracts/quantities';
import { showWithUnit } from '@/api/contracts/quantities';
import type { FluidStateOfService, ServiceInput } from '@/api/contracts/service';

import { degreesText } from '@/components/place/place-words';

import { limitsText, natureText, rangeText } from './service-words';

export type ServiceFactsOptions = { units: UnitSystem; places: readonly { id: string; name: string }[] };

/** All that a service says, as a person reads it. */
export function serviceFacts(service: ServiceInput, { units, places }: ServiceFactsOptions) {
  const { name, fluid, states, hours, codeExempt, note } = service;
  const temperatures = states.map((state) => ({
    term: states.length > 1 ? `Temperatures when ${state.nature}` : 'Temperatures',
    value: temperaturesText(state, units),
  }));
  return [
    { term: 'Name', value: name },
    { term: 'Fluid', value: `${fluid}, ${natureText(states)}` },
    ...temperatures,
    { term: 'Hours a year', value: showWithUnit('hours', hours.value, { units }) },
    { term: 'Limits', value: limitsText(service, places, units) },
    { term: 'Outside the energy code because', value: codeExempt },
    { term: 'Note', value: note },
  ];
}

const temperaturesText = (state: FluidStateOfService, units: UnitSystem) =>
  `${degreesText(state.operating.value, units)} operating, ${rangeText(state, units)}`;
