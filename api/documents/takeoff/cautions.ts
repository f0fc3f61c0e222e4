import type { Snapshot } from '@/api/contracts/revision';

/** What the cautions depend on: fluids, places and materials of a job. */
export type AtRisk = Pick<Snapshot, 'services' | 'places' | 'runs'> & { materialNames: readonly string[] };

const hotToTouch = 44;
const water = /water|glycol|brine|condensate/i;
const hotWater = /domestic|potable|sanitary|hot[- ]?water/i;
const fibrous = /fibre|fiber|wool|mineral|glass (?:mat|blanket)|silicate/i;

type Caution = { words: string; applies: (job: AtRisk) => boolean };
const always = () => true;

const cautions: Caution[] = [
  {
    words:
      'Calculated surface temperatures and heat flows are estimates for steady conditions. Touch limits and energy-code minimums defer to the local code and the authority having jurisdiction; where the law asks for it, a licensed professional confirms the choice for the real installation.',
    applies: always,
  },
  {
    words:
      'Hot surfaces: isolate and lock out, and allow to cool, before touching or working. An infrared reading from bright metal shows the room, not the surface: do not rely on it.',
    applies: ({ services }) =>
      services.some(({ states }) =>
        states.some(({ nature, highest }) => nature === 'hot' && highest.value >= hotToTouch),
      ),
  },
  {
    words: 'Existing insulation may contain asbestos: stop, and have it tested before anybody disturbs it.',
    applies: always,
  },
  {
    words: 'Fibre dust: wear gloves, and protect eyes and breathing, when cutting and fitting.',
    applies: ({ materialNames }) => materialNames.some((name) => fibrous.test(name)),
  },
  { words: 'Heights and confined spaces: the site’s own permit rules come first.', applies: always },
  {
    words:
      'Hot-water services: temperatures and insulation follow the water-safety plan for Legionella control, never the other way round.',
    applies: ({ services }) =>
      services.some(
        ({ name, fluid, states }) =>
          hotWater.test(`${name} ${fluid}`) && states.some(({ operating }) => operating.value < 100),
      ),
  },
  {
    words:
      'Insulation delays freezing, it does not prevent it: still water in freezing air needs heat, flow or draining.',
    applies: ({ services, places, runs }) =>
      runs.some(({ serviceId, placeId }) => {
        const service = services.find(({ id }) => id === serviceId);
        const place = places.find(({ id }) => id === placeId);
        return water.test(service?.fluid ?? '') && (place?.conditions.coldest.air.value ?? 99) <= 0;
      }),
  },
  {
    words: 'Return-air plenums: materials need the flame and smoke index that the place requires (25/50 is common).',
    applies: ({ places, runs }) =>
      places.some(({ id, plenum }) => plenum && runs.some(({ placeId }) => placeId === id)),
  },
  {
    words:
      'Outdoors: sun and clear night sky are not counted; wind is never credited for touch or dew point. A row of the energy code on a cold service promises no dry surface.',
    applies: ({ places, runs }) =>
      places.some(({ id, outdoor }) => outdoor && runs.some(({ placeId }) => placeId === id)),
  },
];

/** The cautions that matter to this job, in the words that are printed and mailed. */
export const cautionsFor = (job: AtRisk): string[] =>
  cautions.filter(({ applies }) => applies(job)).map(({ words }) => words);
