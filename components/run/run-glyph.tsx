import type { JudgedRun } from '@/api/contracts/judgement';
import { Section } from '@/components/diagram/section';

/** The run's section, small; nothing while it is judged, or where there is nothing to cut. */
export function RunGlyph({ judged }: { judged: JudgedRun | undefined }) {
  if (!judged?.body) return null;
  const { body, nature, layerThicknesses, assembly } = judged;
  const layers = layerThicknesses.map((thickness, index) => ({
    materialId: assembly?.layers[index]?.materialId ?? '',
    thickness,
  }));
  return <Section drawn={{ ...body, nature, layers }} size={28} />;
}
