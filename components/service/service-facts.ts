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
    label: states.length > 1 ? `Temperatures when ${state.nature}` : 'Temperatures',
    text: temperaturesText(state, units),
  }));
  return [
    { label: 'Name', text: name },
    { label: 'Fluid', text: `${fluid}, ${natureText(states)}` },
    ...temperatures,
    { label: 'Hours a year', text: showWithUnit('hours', hours.value, { units }) },
    { label: 'Limits', text: limitsText(service, places, units) },
    { label: 'Outside the energy code because', text: codeExempt },
    { label: 'Note', text: note },
  ];
}

const temperaturesText = (state: FluidStateOfService, units: UnitSystem) =>
  `${degreesText(state.operating.value, units)} operating, ${rangeText(state, units)}`;
