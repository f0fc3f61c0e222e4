import type { Candidate, RunStudy, Study } from '@/api/contracts/study';
import type { SectionInput } from '@/api/geometry/section';

/** A hot service gives heat off, a cold one takes it in: as the bare surface says. */
export function natureOf({ candidates }: Study): 'hot' | 'cold' {
  const judgedAt = candidates[0]?.heat.judgedAt;
  return judgedAt && judgedAt.fluid < judgedAt.air ? 'cold' : 'hot';
}

/** What is cut at each thickness, to be drawn. */
export function sectionsOf({ body, assembly, study }: RunStudy): SectionInput[] {
  const nature = natureOf(study);
  return study.candidates.map(({ layerThicknesses }) => ({
    ...body,
    nature,
    layers: layerThicknesses.map((thickness, index) => ({
      materialId: assembly.layers[index]?.materialId ?? '',
      thickness,
    })),
  }));
}

/** Limits that are drawn: a surface to stay below, or to stay above. */
const drawnKinds = ['touch', 'dew-point'] as const;
type DrawnKind = (typeof drawnKinds)[number];

/** The surface under one condition set, at each thickness [°C]. */
export type SurfaceCurve = { id: string; ink: 'hot' | 'cold'; values: (number | null)[] };
export type SurfaceLevel = { id: string; kind: DrawnKind; name: string; value: number };

const surfaceIn = ({ verdicts }: Candidate, kind: DrawnKind): number | null =>
  verdicts.find((verdict) => verdict.kind === kind)?.value ?? null;

/** One for each condition set that a drawn limit uses; where no limit is drawn, the surface that the heat flow goes with. */
export function curvesOf(study: Study): SurfaceCurve[] {
  const curves = drawnKinds.flatMap((kind): SurfaceCurve[] => {
    const values = study.candidates.map((candidate) => surfaceIn(candidate, kind));
    if (values.every((value) => value === null)) return [];
    return [{ id: kind, ink: kind === 'touch' ? 'hot' : 'cold', values }];
  });
  if (curves.length > 0) return curves;
  return [{ id: 'heat', ink: natureOf(study), values: study.candidates.map(({ heat }) => heat.surface) }];
}

/** Each limit that can be drawn across, and the dew point below its margin. */
export function levelsOf({ candidates }: Study): SurfaceLevel[] {
  return drawnKinds.flatMap((kind): SurfaceLevel[] => {
    const verdict = candidates
      .flatMap(({ verdicts }) => verdicts)
      .find((one) => one.kind === kind && one.value !== null);
    if (!verdict || verdict.value === null) return [];
    if (kind === 'touch')
      return verdict.limit === null ? [] : [{ id: kind, kind, name: 'touch limit', value: verdict.limit }];
    const { value, margin, dewPoint } = verdict;
    if (dewPoint === null || margin === null) return [];
    const least = { id: 'margin', kind, name: 'dew point and margin', value: value - margin };
    return value - margin - dewPoint < 0.05 ? [dewLevel(dewPoint)] : [least, dewLevel(dewPoint)];
  });
}
const dewLevel = (value: number): SurfaceLevel => ({ id: 'dew-point', kind: 'dew-point', name: 'dew point', value });
