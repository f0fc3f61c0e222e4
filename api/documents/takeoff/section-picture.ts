import { ink } from '@/api/documents/press/ink';
import type { DrawnSection } from '@/api/contracts/schedule';

/** Where a section stands on the page: centred on `x`, `y`; `scale` in points per metre. */
export type SectionAt = { x: number; y: number; scale: number };

const totalOf = ({ layers }: DrawnSection) => layers.reduce((sum, { thickness }) => sum + thickness, 0);
/** Outer extent of a section [m]: what must fit. */
export const extentOf = (section: DrawnSection): { width: number; height: number } => ({
  width: section.width + 2 * totalOf(section),
  height: section.height + 2 * totalOf(section),
});

/** The scale at which a section fills a square. */
export function fitting(section: DrawnSection, size: number): number {
  const { width, height } = extentOf(section);
  return size / Math.max(width, height, 1e-6);
}

export function drawSection(document: PDFKit.PDFDocument, section: DrawnSection, { x, y, scale }: SectionAt): void {
  const fluid = section.nature === 'hot' ? ink.hot : ink.cold;
  let width = extentOf(section).width * scale;
  let height = extentOf(section).height * scale;
  const outline = (w: number, h: number) =>
    section.shape === 'cylinder' ? document.circle(x, y, w / 2) : document.rect(x - w / 2, y - h / 2, w, h);
  for (const layer of section.layers.toReversed()) {
    outline(width, height).lineWidth(0.7).fillAndStroke(ink.sheet, ink.text);
    width -= 2 * layer.thickness * scale;
    height -= 2 * layer.thickness * scale;
  }
  outline(width, height).lineWidth(1).fillAndStroke(ink.wash, fluid);
}
