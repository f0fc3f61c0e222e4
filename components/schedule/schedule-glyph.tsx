import type { ScheduleRow } from '@/api/contracts/schedule';
import { DrawnSection } from '@/components/drawing/drawn';

/** The section of a schedule's row, to scale. */
export function ScheduleGlyph({ row: { section }, size }: { row: ScheduleRow; size: 28 | 40 | 120 }) {
  return section ? <DrawnSection drawn={section} size={size} /> : null;
}
