import { sizesAndThickness } from './schedule-words';
import type { DrawnSection, ScheduleRow } from '@/api/contracts/schedule';
import { gap, hairline, room } from '@/api/documents/press/flow';
import { body, ink, styles } from '@/api/documents/press/ink';

import { drawSection, extentOf } from './section-picture';
import type { Sheet } from './sheet';

const most = 7;
const height = 96;

/** Sections of this job at one scale on a common base line, growing from left to right. */
export function printSectionLine(sheet: Sheet): void {
  const { flow, snapshot } = sheet;
  const drawn = chosen(snapshot.schedule.rows);
  if (drawn.length < 2) return;
  gap(flow, 16);
  room(flow, height + 44);
  const scale = scaleFor(drawn.map(({ section }) => section));
  const base = flow.y + height;
  const alt = `Sections at one scale: ${drawn.map(({ row }) => sizesAndThickness(row)).join('; ')}`;
  flow.part.add(flow.document.struct('Figure', { alt }, () => drawAll(sheet, drawn, { base, scale })));
  flow.y = base + 34;
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

function drawAll({ flow }: Sheet, drawn: Drawn[], { base, scale }: { base: number; scale: number }): void {
  const widths = drawn.map(({ section }) => Math.max(extentOf(section).width * scale, 44));
  const between = (body.width - widths.reduce((sum, width) => sum + width, 0)) / (drawn.length - 1);
  let x: number = body.left;
  drawn.forEach(({ row, section }, index) => {
    const centre = x + widths[index]! / 2;
    const radius = (extentOf(section).height * scale) / 2;
    drawSection(flow.document, section, { x: centre, y: base - radius, scale });
    label(flow, sizesAndThickness(row), { centre, y: base + 5, width: widths[index]! + Math.min(between, 24) });
    x += widths[index]! + between;
  });
  artifactLine(flow, base);
}

const artifactLine = (flow: Sheet['flow'], y: number) => hairline(flow, y, { colour: ink.text, width: 0.8 });

type Label = { centre: number; y: number; width: number };
function label(flow: Sheet['flow'], words: string, { centre, y, width }: Label): void {
  const lines = words.split('\n').flatMap((part) => flow.wrap.lines(part, styles.note, width));
  lines.slice(0, 2).forEach((line, index) => {
    const style = index === 0 ? styles.noteStrong : styles.note;
    flow.line(line, { x: centre - flow.wrap.width(line, style) / 2, y: y + index * style.leading, style });
  });
}
