import type { BodyKind, BuildUp, Layer, SpecificationRow } from '@/api/contracts/build-up';
import type { JobData } from '@/api/contracts/job-data';
import type { Override, Run, ShapeKind } from '@/api/contracts/run';
import type { Assembly } from '@/api/contracts/study';
import { finish, material } from '@/api/engine/standards/library';
import type { VapourRetarder } from '@/api/engine/standards/rows';

import { dnOf } from './sizes';

/** With what a run is insulated, before its thickness is studied. */
export type Assembled = {
  layers: Layer[];
  finishId: string;
  vapourRetarder: VapourRetarder;
  /** the outermost thickness is named: chosen or specified, else the study proposes it */
  source: 'chosen' | 'specified' | 'proposed';
  row: SpecificationRow | null;
  reason: string;
  codeExempt: string;
};

const bodies: Record<ShapeKind, BodyKind> = {
  pipe: 'pipe',
  'round-duct': 'duct',
  'rectangular-duct': 'duct',
  vessel: 'equipment',
  flat: 'equipment',
  piece: 'equipment',
};
export const bodyKindOf = (run: Run): BodyKind => bodies[run.shape.kind];

/** Chosen over specified over proposed; null where nothing says how to insulate the run. */
export function assemble(data: JobData, run: Run): Assembled | null {
  const row = narrowest(data.specification, run);
  const covering: Partial<Covering> = { ...(row ?? narrowest(data.buildUps, run)), ...chosen(run.override) };
  const { layers, finishId, vapourRetarder = 'none' } = covering;
  if (!layers || !finishId) return null;
  return {
    layers,
    finishId,
    vapourRetarder,
    source: sourceOf(run, layers),
    row,
    reason: run.override?.reason ?? '',
    codeExempt: run.override?.codeExempt || serviceExempt(data, run),
  };
}

type Covering = Pick<BuildUp, 'layers' | 'finishId' | 'vapourRetarder'>;

/** What an override names; what it leaves open stays as the row has it. */
const chosen = (override: Override | null): Partial<Covering> => ({
  ...(override?.layers && { layers: override.layers }),
  ...(override?.finishId && { finishId: override.finishId }),
  ...(override?.vapourRetarder && { vapourRetarder: override.vapourRetarder }),
});

function sourceOf({ override }: Run, layers: readonly Layer[]): Assembled['source'] {
  if (layers.at(-1)?.thickness === null) return 'proposed';
  return Object.keys(chosen(override)).length > 0 ? 'chosen' : 'specified';
}

const serviceExempt = (data: JobData, run: Run): string =>
  data.services.find(({ id }) => id === run.serviceId)?.codeExempt ?? '';

type Scope = Pick<BuildUp, 'serviceId' | 'appliesTo' | 'placeIds' | 'fromDn' | 'toDn'>;
const largestDn = 5000;

/** Of the rows that fit a run: named places before all places, the narrower band before the wider, then the first. */
export function narrowest<Row extends Scope>(rows: readonly Row[], run: Run): Row | null {
  const dn = dnOf(run);
  const fitting = rows.filter((row) => fits(row, run, dn));
  return fitting.reduce<Row | null>((best, row) => (best && !isNarrower(row, best) ? best : row), null);
}

function fits(row: Scope, run: Run, dn: number | null): boolean {
  if (row.serviceId !== run.serviceId || row.appliesTo !== bodyKindOf(run)) return false;
  if (row.placeIds.length > 0 && !row.placeIds.includes(run.placeId)) return false;
  return isInBand(row, dn);
}

function isInBand({ fromDn, toDn }: Scope, dn: number | null): boolean {
  if (fromDn === null && toDn === null) return true;
  return dn !== null && dn >= (fromDn ?? 0) && dn <= (toDn ?? largestDn);
}

function isNarrower(row: Scope, than: Scope): boolean {
  const named = (scope: Scope) => (scope.placeIds.length > 0 ? 0 : 1);
  if (named(row) !== named(than)) return named(row) < named(than);
  return bandOf(row) < bandOf(than);
}
const bandOf = ({ fromDn, toDn }: Scope): number =>
  fromDn === null && toDn === null ? Infinity : (toDn ?? largestDn) - (fromDn ?? 0);

/** As screens and documents read it: materials and finish by name, each layer with the thickness that is put up. */
export function toAssembly(assembled: Assembled, names: readonly Layer['thickness'][]): Assembly {
  return {
    source: assembled.source,
    specificationLabel: assembled.row?.label ?? null,
    reason: assembled.reason,
    layers: assembled.layers.map(({ materialId, thickness }, index) => ({
      materialId,
      materialName: material(materialId).name,
      thickness: names[index] ?? thickness,
    })),
    finishId: assembled.finishId,
    finishName: finish(assembled.finishId).name,
    vapourRetarder: assembled.vapourRetarder,
    codeExempt: assembled.codeExempt,
  };
}
