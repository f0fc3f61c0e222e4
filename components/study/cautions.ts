import type { Place } from '@/api/contracts/place';
import type { Service } from '@/api/contracts/service';

import type { StudiedRun } from './study-facts';

export type Caution = { key: string; title: string; text: string };

type Around = { runStudy: StudiedRun; place: Place | undefined; service: Service | undefined };

/** From here up a bare surface can burn in a short contact [°C]: lowest of the usual project limits for vulnerable people. */
const burnsFrom = 43;
const isForTaps = /domestic|potable|drinking|tap water/i;

/** What can hurt someone about this run, said where it matters and never cheerfully. */
export function cautionsOf({ runStudy: { study, nature }, place, service }: Around): Caution[] {
  const isHot = nature === 'hot';
  const isCold = !isHot || service?.states.some(({ nature }) => nature === 'cold');
  return [
    ...(warmestBare(study) > burnsFrom ? [hotSurfaces] : []),
    ...(isCold ? [coldEnds] : []),
    ...(isHot && isTapped(service) ? [tapWater] : []),
    ...(place?.plenum ? [plenum] : []),
  ];
}

const isTapped = (service: Service | undefined) =>
  service !== undefined && isForTaps.test(`${service.name} ${service.fluid}`);

/** The bare surface where it is judged at its warmest [°C]. */
function warmestBare({ candidates: [bare] }: StudiedRun['study']): number {
  const touched = bare?.verdicts.find(({ kind }) => kind === 'touch')?.value;
  return Math.max(touched ?? -Infinity, bare?.heat.surface ?? -Infinity);
}

const hotSurfaces: Caution = {
  key: 'hot',
  title: 'Hot surfaces',
  text: 'Valves, flanges and gaps in the insulation are as hot as the pipe. Isolate, lock out and let it cool before work, and do not trust an infrared reading from bright metal.',
};
const coldEnds: Caution = {
  key: 'cold',
  title: 'Cold service',
  text: 'This judges the straight run. Hangers, valves, ends and gaps in the vapour retarder sweat first: carry insulation and retarder through them.',
};
const tapWater: Caution = {
  key: 'tap-water',
  title: 'Hot water for taps',
  text: 'Neither insulate over, nor choose temperatures around, Legionella control without the water-safety plan of the building.',
};
const plenum: Caution = {
  key: 'plenum',
  title: 'Air plenum',
  text: 'Insulation, jacket and adhesive need the flame and smoke index that is required locally; 25/50 is common.',
};

/** Stands under every study. */
export const standingCaution =
  'Calculated surfaces are estimates for steady conditions. Touch limits and code minimums defer to the local code and the authority having jurisdiction; the choice for a real installation is confirmed by a licensed professional where the law asks for one.';
