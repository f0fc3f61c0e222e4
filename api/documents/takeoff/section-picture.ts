import type { DrawnSection } from '@/api/contracts/schedule';
import { ink } from '@/api/documents/press/ink';
import { section, sectionToScale, type SectionDrawing } from '@/api/geometry/section';

/** Where a section stands on the page: the left upper corner of its square, in points. */
export type SectionAt = { x: number; y: number };

// paper shows finer lines than a screen: drawn at double size, and put down at half
const finer = 2;

/** A section to its own scale, filling a square of `size` points. */
export function drawSection(
  document: PDFKit.PDFDocument,
  drawn: DrawnSection,
  { x, y, size }: SectionAt & { size: number },
): void {
  put(document, section(drawn, size * finer), { x, y });
}

/** A section at so many points per metre; gives what it covers of the page. */
export const measuredAt = (drawn: DrawnSection, scale: number) => {
  const drawing = sectionToScale(drawn, scale * finer);
  const { x, y, width, height } = drawing.box;
  return { drawing, left: x / finer, top: y / finer, width: width / finer, height: height / finer };
};

export function put(document: PDFKit.PDFDocument, drawing: SectionDrawing, { x, y }: SectionAt): void {
  const { bore, layers, jacket, nature, pens } = drawing;
  document
    .save()
    .translate(x, y)
    .scale(1 / finer)
    .lineCap('round')
    .lineJoin('round');
  for (const layer of layers.toReversed()) {
    document.path(layer.outline).lineWidth(pens.outline).fillAndStroke(ink.sheet, ink.text);
    stroke(document, layer.hatch, { width: layer.hatchPen, colour: ink.soft });
  }
  document.path(bore.outline).lineWidth(pens.wall).fillAndStroke(ink.sheet, ink.text);
  stroke(document, bore.hatch, { width: pens.hatch, colour: ink[nature] });
  stroke(document, jacket, { width: pens.jacket, colour: ink.text });
  document.restore();
}

type Pen = { width: number; colour: string };
function stroke(document: PDFKit.PDFDocument, path: string, { width, colour }: Pen): void {
  if (path) document.path(path).lineWidth(width).stroke(colour);
}
