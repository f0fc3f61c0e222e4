import type { VapourRetarder } from './rows';

/** What each vapour retarder is, in the words of a specification. */
export const vapourRetarderNames: Record<VapourRetarder, string> = {
  none: 'No vapour retarder',
  'sealed-facing':
    'Factory facing with all laps, butt joints, fittings and ends sealed; vapour stops at valves and every 4.6 m',
  'closed-cell': 'The closed-cell material itself, every joint glued or sealed',
  'mastic-and-mesh': 'Two coats of vapour-retarder mastic with mesh between, under the jacket',
};
