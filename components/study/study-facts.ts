import type { Candidate, RunStudy, Study } from '@/api/contracts/study';
import type { SectionInput } from '@/api/geometry/section';

/** A run's study, and in which ink it is drawn: as the service is, whatever the weather does. */
export type StudiedRun = RunStudy & { nature: 'hot' | 'cold' };

/** What is cut at each thickness, to be drawn. */
export function sectionsOf({ body, assembly, study, nature }: StudiedRun): SectionInput[] {
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
/** A level by its name; `above` [K] is what it asks above the dew point. */
export type SurfaceLevel = { id: string; kind: DrawnKind; name: string; above: number | null; value: number };

const surfaceIn = ({ verdicts }: Candidate, kind: DrawnKind): number | null =>
  verdicts.find((verdict) => verdict.kind === kind)?.value ?? null;

/** One for each condition set that a drawn limit uses; where no limit is drawn, the surface that the heat flow goes with. */
export function curvesOf({ study, nature }: Pick<StudiedRun, 'study' | 'nature'>): SurfaceCurve[] {
  const curves = drawnKinds.flatMap((kind): SurfaceCurve[] => {
    const values = study.candidates.map((candidate) => surfaceIn(candidate, kind));
    if (values.every((value) => value === null)) return [];
    return [{ id: kind, ink: kind === 'touch' ? 'hot' : 'cold', values }];
  });
  if (curves.length > 0) return curves;
  return [{ id: 'heat', ink: nature, values: study.candidates.map(({ heat }) => heat.surface) }];
}

/** Each limit that can be drawn across, and the dew point below its margin. */
export function levelsOf({ candidates }: Study): SurfaceLevel[] {
  return drawnKinds.flatMap((kind): SurfaceLevel[] => {
    const verdict = candidates
      .flatMap(({ verdicts }) => verdicts)
      .find((one) => one.kind === kind && one.value !== null);
    if (!verdict || verdict.value === null) return [];
    if (kind === 'touch')
      return verdict.limit === null ? [] : [{ id: kind, kind, name: 'touch limit', above: null, value: verdict.limit }];
    const { value, margin, dewPoint } = verdict;
    if (dewPoint === null || margin === null) return [];
    const least = value - margin;
    const asked = { id: 'margin', kind, name: 'dew point', above: least - dewPoint, value: least };
    return least - dewPoint < 0.05 ? [dewLevel(dewPoint)] : [asked, dewLevel(dewPoint)];
  });
}
const dewLevel = (value: number): SurfaceLevel => ({
  id: 'dew-point',
  kind: 'dew-point',
  name: 'dew point',
  above: null,
  value,
});
