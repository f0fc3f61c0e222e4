import type { ScheduleRow } from '@/api/contracts/schedule';
import { Section } from '@/components/diagram/section';

/** The section of a schedule's row, to scale. */
export function ScheduleGlyph({ row: { section }, size }: { row: ScheduleRow; size: 28 | 40 | 120 }) {
  return section ? <Section drawn={section} size={size} /> : null;
}
