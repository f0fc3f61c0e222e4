import { body, ink, page, styles, type Style } from './ink';
import type { Press } from './press';

/** What is printed one under the other, over as many pages as it takes. `y` is where the next thing goes. */
export type Flow = Press & { y: number; part: PDFKit.PDFStructureElement; root: PDFKit.PDFStructureElement };

export function openFlow(press: Press, startPage: () => void): Flow {
  const root = press.document.struct('Document');
  press.document.addStructure(root);
  press.document.on('pageAdded', startPage);
  press.document.addPage();
  return { ...press, y: body.top, part: root, root };
}

export const left = (flow: Flow): number => body.bottom - flow.y;

/** Starts a new page unless so much is left of this one. */
export function room(flow: Flow, height: number): void {
  if (left(flow) >= height) return;
  flow.document.addPage();
  flow.y = body.top;
}

export const gap = (flow: Flow, height: number): void => {
  flow.y = flow.y === body.top ? flow.y : flow.y + height;
};

/** A part of the document with its heading, its bookmark and a place that links can name. */
export function openPart(flow: Flow, title: string, least = 140): void {
  gap(flow, 26);
  room(flow, least);
  flow.part = flow.document.struct('Sect', { title });
  flow.root.add(flow.part);
  // pdfkit counts `left` from the right edge
  const place = { expanded: false, top: flow.y - 12, left: page.width };
  flow.document.outline.addItem(title, place);
  tagged(flow, 'H2', () => printLines(flow, title, { style: styles.heading }));
  gap(flow, 6);
}

/** Ends the open part: nothing is tagged into it any more. */
export const closePart = (flow: Flow): void => {
  flow.part.end();
  flow.part = flow.root;
};

export function tagged(flow: Flow, tag: string, print: () => void): void {
  flow.part.add(flow.document.struct(tag, {}, print));
}

type Block = { style: Style; x?: number; width?: number };

/** Prints wrapped lines at the cursor without minding the page's end. */
export function printLines(flow: Flow, text: string, { style, x = body.left, width = body.width }: Block): void {
  for (const line of flow.wrap.lines(text, style, width)) {
    flow.line(line, { x, y: flow.y, style });
    flow.y += style.leading;
  }
}

/** A paragraph; where a page ends its lines go on, never one alone. */
export function paragraph(flow: Flow, text: string, block: Block): void {
  const { style, x = body.left, width = body.width } = block;
  let lines = flow.wrap.lines(text, style, width);
  while (lines.length > 0) {
    room(flow, style.leading * Math.min(lines.length, 2));
    const fitting = Math.max(1, Math.floor(left(flow) / style.leading));
    const now = lines.slice(0, lines.length - fitting === 1 ? fitting - 1 || 1 : fitting);
    tagged(flow, 'P', () => {
      for (const line of now) {
        flow.line(line, { x, y: flow.y, style });
        flow.y += style.leading;
      }
    });
    lines = lines.slice(now.length);
  }
}

export function subheading(flow: Flow, text: string, { least = 104, tag = 'H3' } = {}): void {
  gap(flow, 12);
  room(flow, least);
  tagged(flow, tag, () => printLines(flow, text, { style: styles.subheading }));
  gap(flow, 2);
}

/** Something that only decorates: readers of the screen skip it. */
export function artifact(flow: Pick<Press, 'document'>, draw: () => void): void {
  flow.document.markContent('Artifact', { type: 'Layout' });
  draw();
  flow.document.endMarkedContent();
}

type Hairline = { from?: number; to?: number; colour?: string; width?: number };

export function hairline({ document }: Pick<Press, 'document'>, y: number, line: Hairline = {}): void {
  const { from = body.left, to = body.right, colour = ink.rule, width = 0.6 } = line;
  document.moveTo(from, y).lineTo(to, y).lineWidth(width).stroke(colour);
}
