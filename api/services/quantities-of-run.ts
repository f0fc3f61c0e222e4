import { lengthOf } from '@/api/contracts/run-words';
import { fittingKinds, type Fittings, type Shape } from '@/api/contracts/run';
import type { TakeoffLine } from '@/api/contracts/schedule';
import type { Candidate } from '@/api/engine/limits/study-types';
import { cylinderArea, rectangularDuctArea, vesselArea } from '@/api/engine/takeoff/finished-area';
import type { NetQuantities } from '@/api/engine/takeoff/net-quantities';

/** `used`: what is put up, for the made diameter; null leaves the finished area open. */
export const quantitiesOf = (shape: Shape, used: Candidate | null): NetQuantities => ({
  length: lengthOf(shape),
  area: areaOf(shape, used),
  count: 'count' in shape ? shape.count : null,
});

function areaOf(shape: Shape, used: Candidate | null): number | null {
  if (shape.kind === 'flat') return shape.area.value * shape.count;
  if (!used || shape.kind === 'piece') return null;
  const thickness = used.layerThicknesses.reduce((sum, layer) => sum + layer, 0);
  switch (shape.kind) {
    case 'rectangular-duct':
      return rectangularDuctArea({
        width: shape.width.value,
        height: shape.height.value,
        thickness,
        length: shape.length.value,
      });
    case 'vessel':
      return shape.count * vesselArea({ outsideDiameter: shape.diameter.value + 2 * thickness, ...vesselSize(shape) });
    case 'pipe':
      return used.outsideDiameter === null ? null : cylinderArea(used.outsideDiameter, shape.length.value);
    case 'round-duct':
      return cylinderArea(shape.diameter.value + 2 * thickness, shape.length.value);
  }
}

const vesselSize = ({ length, ends }: Extract<Shape, { kind: 'vessel' }>) => ({ length: length.value, ends });

/** Counts of fittings added up, in the trade's order. */
export const addFittings = (all: readonly Fittings[]): TakeoffLine['fittings'] =>
  fittingKinds.flatMap((kind) => {
    const count = all.reduce((sum, fittings) => sum + (fittings[kind] ?? 0), 0);
    return count > 0 ? [{ kind, count }] : [];
  });
