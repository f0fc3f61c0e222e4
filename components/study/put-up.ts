import type { SpecificationRow } from '@/api/contracts/build-up';
import type { RunStudy } from '@/api/contracts/study';

/** Where the three thicknesses stand among those that are made; null: not among them, or nobody named one. */
export type Standing = { specified: number | null; chosen: number | null; proposed: number | null };

/** The row that the run falls under, by its label. */
export function rowOf(
  { assembly }: RunStudy,
  specification: readonly SpecificationRow[] | undefined,
  serviceId: string,
): SpecificationRow | undefined {
  const { specificationLabel } = assembly;
  if (specificationLabel === null) return undefined;
  const labelled = specification?.filter(({ label }) => label === specificationLabel) ?? [];
  return labelled.find((row) => row.serviceId === serviceId) ?? labelled[0];
}

export function standingOf({ study, assembly }: RunStudy, row: SpecificationRow | undefined): Standing {
  const { specified, proposed } = study;
  if (assembly.source === 'proposed') return { specified: null, chosen: null, proposed };
  if (assembly.source === 'specified') return { specified, chosen: null, proposed };
  return { specified: placeOf(study, row), chosen: specified, proposed };
}

/** The row's own thickness among those that are studied: only where it is of as many layers, all named alike. */
function placeOf({ candidates }: RunStudy['study'], row: SpecificationRow | undefined): number | null {
  const names = row?.layers.map(({ thickness }) => thickness).join();
  const place = candidates.findIndex((candidate) => candidate.name !== null && candidate.names.join() === names);
  return place < 0 ? null : place;
}

/** The words under a section. */
export const standingWords = (standing: Standing, place: number): string[] =>
  (['specified', 'chosen', 'proposed'] as const).filter((word) => standing[word] === place);
