import type { BuildUp } from '@/api/contracts/build-up';
import type { SectionInput } from '@/api/geometry/section';
import { DrawnSection } from '@/components/drawing/drawn';

import type { CoveringNames } from './covering-words';
import { metresOf } from './layer-options';

type Covering = Pick<BuildUp, 'serviceId' | 'appliesTo' | 'fromDn' | 'toDn' | 'layers'>;
type Names = Pick<CoveringNames, 'services' | 'sizes'>;

/** What a row puts up, drawn on the smallest of its sizes; nothing where a thickness is still to be found. */
export function CoveringGlyph({ row, names }: { row: Covering; names: Names }) {
  const drawn = drawnCovering(row, names);
  return drawn ? <DrawnSection drawn={drawn} size={28} /> : null;
}

export function drawnCovering(row: Covering, { services, sizes }: Names): SectionInput | null {
  const layers = row.layers.flatMap(({ materialId, thickness }) =>
    thickness === null ? [] : [{ materialId, thickness: metresOf(thickness) }],
  );
  if (layers.length < row.layers.length) return null;
  const nature = services.find(({ id }) => id === row.serviceId)?.states[0]?.nature ?? 'hot';
  if (row.appliesTo === 'duct') return { shape: 'rectangle', width: 0.6, height: 0.4, layers, nature };
  if (row.appliesTo === 'equipment') return { shape: 'wall', width: 1, height: 1, layers, nature };
  const outside = outsideOf(row, sizes);
  return { shape: 'cylinder', width: outside, height: outside, layers, nature };
}

/** DN 50 stands for a row that names no size. */
function outsideOf({ fromDn, toDn }: Covering, sizes: CoveringNames['sizes']): number {
  const dn = fromDn ?? toDn ?? 50;
  return sizes.find((size) => size.dn === dn)?.outsideDiameter ?? dn / 1000;
}
