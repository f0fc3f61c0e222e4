import type { Layer, SpecificationRow } from '@/api/contracts/build-up';
import type { Override, Run } from '@/api/contracts/run';
import type { Candidate, RunStudy } from '@/api/contracts/study';

const nothing: Override = {
  reason: '',
  state: null,
  layers: null,
  finishId: null,
  vapourRetarder: null,
  codeExempt: '',
};

/** The layers of a studied thickness; a wrap's thickness as put up is kept where the thickness stays the same. */
export function layersAt({ assembly }: RunStudy, { names }: Candidate, known: readonly Layer[] = []): Layer[] {
  return assembly.layers.map(({ materialId, thickness: now }, index) => {
    const thickness = names[index] ?? now;
    const before = known[index];
    const isSame = before?.materialId === materialId && before.thickness === thickness;
    return { materialId, thickness, installed: isSame ? before.installed : null };
  });
}

/** What else the run departs in stays; the reason is the one just given. */
export const departure = (run: Run, change: Partial<Override> & { reason: string }): Override => ({
  ...(run.override ?? nothing),
  ...change,
});

/** Material, thickness and finish as the specification has them; a service state or an exemption of the run's own stays. */
export function asSpecified({ override }: Run): Override | null {
  if (!override || (override.state === null && override.codeExempt === '')) return null;
  return { ...override, layers: null, finishId: null, vapourRetarder: null };
}

/** Only the thickness goes back; nothing is left of a departure that changed nothing else. */
export function thicknessAsSpecified(run: Run): Override | null {
  if (!run.override?.finishId && !run.override?.vapourRetarder) return asSpecified(run);
  return { ...run.override, layers: null };
}

/** The finish that the row names needs no departure. */
export const finishChoice = (finishId: string, row: SpecificationRow | undefined): string | null =>
  row?.finishId === finishId ? null : finishId;
