import { sizesAndThickness } from './schedule-words';
import { extentOf } from '@/api/geometry/section';
import type { DrawnSection, ScheduleRow } from '@/api/contracts/schedule';
import { gap, hairline, room } from '@/api/documents/press/flow';
import { body, ink, styles } from '@/api/documents/press/ink';

import { measuredAt, put } from './section-picture';
import type { Sheet } from './sheet';

const most = 7;
const height = 96;

/** Sections of this job at one scale on a common base line, growing from left to right. */
export function printSectionLine(sheet: Sheet): void {
  const { flow, snapshot } = sheet;
  const drawn = chosen(snapshot.schedule.rows);
  if (drawn.length < 2) return;
  gap(flow, 16);
  room(flow, height + 52);
  const scale = scaleFor(drawn.map(({ section }) => section));
  const base = flow.y + height;
  const alt = `Sections at one scale: ${drawn.map(({ row }) => sizesAndThickness(row)).join('; ')}`;
  flow.part.add(flow.document.struct('Figure', { alt }, () => drawAll(sheet, drawn, { base, scale })));
  flow.y = base + 42;
}

type Drawn = { row: ScheduleRow; section: DrawnSection };

/** Different sections of pipes and round ducts, evenly through the sizes. */
function chosen(rows: ScheduleRow[]): Drawn[] {
  const different = new Map<string, Drawn>();
  for (const row of rows) {
    const { section } = row;
    if (section?.shape === 'cylinder' && section.layers.length > 0)
      different.set(JSON.stringify(section), { row, section });
  }
  const sorted = [...different.values()].sort(
    (one, other) => extentOf(one.section).width - extentOf(other.section).width,
  );
  if (sorted.length <= most) return sorted;
  return Array.from({ length: most }, (_, index) => sorted[Math.round((index * (sorted.length - 1)) / (most - 1))]!);
}

const space = 18;
function scaleFor(sections: DrawnSection[]): number {
  const widths = sections.map((section) => extentOf(section).width);
  const across = widths.reduce((sum, width) => sum + width, 0);
  return Math.min((body.width - space * (sections.length - 1)) / across, height / Math.max(...widths));
}

type Standing = { base: number; scale: number };
function drawAll({ flow }: Sheet, drawn: Drawn[], { base, scale }: Standing): void {
  const measured = drawn.map((one) => ({ ...one, ...measuredAt(one.section, scale) }));
  const widths = measured.map(({ width }) => Math.max(width, 50));
  const between = (body.width - widths.reduce((sum, width) => sum + width, 0)) / (drawn.length - 1);
  let x: number = body.left;
  measured.forEach(({ row, drawing, left, top, width, height: tall }, index) => {
    const room = widths[index]!;
    put(flow.document, drawing, { x: x + (room - width) / 2 - left, y: base - tall - top });
    label(flow, sizesAndThickness(row), { centre: x + room / 2, y: base + 5, width: room + Math.min(between - 4, 24) });
    x += room + between;
  });
  hairline(flow, base, { colour: ink.text, width: 0.8 });
}

type Label = { centre: number; y: number; width: number };
/** Size over thickness, both centred; a long size takes two lines. */
function label(flow: Sheet['flow'], words: string, { centre, y, width }: Label): void {
  const [size = '', thickness = ''] = words.split('\n');
  const lines = flow.wrap.lines(size, styles.noteStrong, width).slice(0, 2);
  [...lines, thickness].forEach((line, index) => {
    const style = index < lines.length ? styles.noteStrong : styles.note;
    flow.line(line, { x: centre - flow.wrap.width(line, style) / 2, y: y + index * style.leading, style });
  });
}
