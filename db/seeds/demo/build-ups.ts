import type { BodyKind, BuildUpInput } from '@/api/contracts/build-up';

import type { PlaceKey } from './places';
import type { ServiceKey } from './services';
import { layer } from './specification';

/** With what a service is insulated where the specification has no row: the study proposes the thickness. */
export type DemoBuildUp = Omit<BuildUpInput, 'serviceId' | 'placeIds'> & { service: ServiceKey; places: PlaceKey[] };

type Covering = { material: string; finish: string; retarder?: DemoBuildUp['vapourRetarder']; places?: PlaceKey[] };

const buildUp = (service: ServiceKey, appliesTo: BodyKind, put: Covering): DemoBuildUp => ({
  service,
  appliesTo,
  places: put.places ?? [],
  fromDn: null,
  toDn: null,
  layers: [layer(put.material, null)],
  finishId: `std/${put.finish}`,
  vapourRetarder: put.retarder ?? 'none',
  note: '',
});

const inMetal = { material: 'mf_pipe', finish: 'aluminium-sheet' };
const inFactoryJacket = { material: 'mf_pipe', finish: 'all-service-jacket' };
const sealed = { ...inFactoryJacket, retarder: 'sealed-facing' } as const;

export const demoBuildUps = [
  buildUp('steam', 'pipe', inMetal),
  buildUp('condensate', 'pipe', inMetal),
  buildUp('heating-flow', 'pipe', inFactoryJacket),
  buildUp('heating-return', 'pipe', inFactoryJacket),
  buildUp('domestic-hot', 'pipe', inFactoryJacket),
  buildUp('domestic-cold', 'pipe', sealed),
  buildUp('chilled', 'pipe', sealed),
  buildUp('chilled', 'pipe', {
    material: 'cellular_glass',
    finish: 'white-painted-aluminium',
    retarder: 'mastic-and-mesh',
    places: ['roof'],
  }),
  buildUp('refrigerant-suction', 'pipe', {
    material: 'elastomeric',
    finish: 'elastomeric-skin',
    retarder: 'closed-cell',
  }),
  buildUp('supply-air', 'duct', {
    material: 'mf_board',
    finish: 'all-service-jacket',
    retarder: 'sealed-facing',
  }),
  buildUp('outside-air', 'duct', {
    material: 'mf_board',
    finish: 'all-service-jacket',
    retarder: 'sealed-facing',
  }),
];
