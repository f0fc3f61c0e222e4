import type { HeatLayer, HeatResult } from '../heat/heat-case';
import { findPipeSize } from '../standards/pipe-sizes';
import type { PipeStandard } from '../standards/rows';
import type { Body } from './study-types';

/** Conductivity of the plastic [W/(m·K)], the upper end of what is usual: from memory of makers' and handbook data, medium. */
const conductivities: Partial<Record<PipeStandard, number>> = {
  'cpvc-ips': 0.14,
  'cpvc-cts': 0.14,
  'pvc-ips': 0.19,
  'pex-cts': 0.41,
};

/**
 * The wall of a plastic pipe as the innermost layer: it holds heat back enough to count, metal does not. Of several
 * walls the thinnest, since the run does not say which; so heat and surface are never better than they will be.
 *
 * @returns undefined for metal, ducts, equipment and free diameters
 * @source walls by the pipe's standard; conductivities from memory, medium
 */
export function plasticWall(body: Body): HeatLayer | undefined {
  if (body.shape !== 'pipe' || !body.standard || !body.nominal) return undefined;
  const conductivity = conductivities[body.standard];
  const walls = findPipeSize(body.standard, body.nominal)?.walls ?? [];
  if (conductivity === undefined || walls.length === 0) return undefined;
  const thickness = Math.min(...walls.map((wall) => wall.thickness));
  return { thickness, conductivity: [[20, conductivity]] };
}

/** What the reader of a result must know of it. */
export const plasticNote = ({ thickness, conductivity }: HeatLayer): string =>
  `The wall of the plastic pipe is counted: ${(thickness * 1000).toFixed(1)} mm at ${conductivity[0]?.[1]} W/(m·K), from memory.`;

/** The result with the pipe's outer surface as the first interface again: the wall is no layer of insulation. */
export const withoutWall = (result: HeatResult): HeatResult => ({
  ...result,
  interfaceTemperatures: result.interfaceTemperatures.slice(1),
  meanConductivities: result.meanConductivities.slice(1),
  notes: result.notes.filter((note) => !note.startsWith('Layer 1:')),
});
