import { DrawnSection } from '@/components/drawing/drawn';

type MaterialGlyphProps = { materialId: string; size: 28 | 120; isClosed: boolean; label?: string };

/** A material's own hatch, as it is drawn everywhere: 51 mm of it on a DN 50 pipe. */
export const MaterialGlyph = ({ materialId, size, isClosed, label }: MaterialGlyphProps) => (
  <DrawnSection
    drawn={{
      shape: 'cylinder',
      width: 0.0603,
      height: 0.0603,
      layers: [{ materialId, thickness: 0.0508 }],
      nature: isClosed ? 'cold' : 'hot',
    }}
    size={size}
    label={label}
  />
);
