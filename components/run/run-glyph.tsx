import type { JudgedRun } from '@/api/contracts/judgement';
import { DrawnSection } from '@/components/drawing/drawn';

/** The run's section, small; nothing while it is judged, or where there is nothing to cut. */
export function RunGlyph({ judged }: { judged: JudgedRun | undefined }) {
  if (!judged?.body) return null;
  const { body, nature, layerThicknesses, assembly } = judged;
  const layers = layerThicknesses.map((thickness, index) => ({
    materialId: assembly?.layers[index]?.materialId ?? '',
    thickness,
  }));
  return <DrawnSection drawn={{ ...body, nature, layers }} size={28} />;
}
