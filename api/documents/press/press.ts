import PDFDocument from 'pdfkit';

import { fontFiles } from './fonts';
import { page, type Style } from './ink';
import { createPrintable, type Printable } from './printable';
import { createWrap, type Wrap } from './wrap';

export type Imprint = { title: string; author: string; subject: string; language: string; madeAt: Date };

/** Where everything is printed: the document, its measure of text, and one line of text at a place. */
export type Press = {
  document: PDFKit.PDFDocument;
  printable: Printable;
  wrap: Wrap;
  line: (text: string, at: LineAt) => void;
};
/** `y` is the top of the line; `x` its left edge, or its right one. */
export type LineAt = {
  x: number;
  y: number;
  style: Style;
  align?: 'left' | 'right';
  goTo?: string;
  link?: PDFKit.PDFStructureElement;
};

export function openPress({ title, author, subject, language, madeAt }: Imprint): Press {
  const document = new PDFDocument({
    size: 'A4',
    margin: 0,
    autoFirstPage: false,
    bufferPages: true,
    tagged: true,
    displayTitle: true,
    lang: language,
    pdfVersion: '1.7',
    info: {
      Title: title,
      Author: author,
      Subject: subject,
      Creator: 'Thickset',
      CreationDate: madeAt,
      ModDate: madeAt,
    },
  });
  // opened anew for each document: a font that another document used would leave its traces in the bytes
  for (const [name, file] of Object.entries(fontFiles)) document.registerFont(name, file);
  const printable = createPrintable(document);
  const wrap = createWrap(document, printable);
  return { document, printable, wrap, line: (text, at) => printLine({ document, wrap }, printable.of(text), at) };
}

type Printing = Pick<Press, 'document' | 'wrap'>;
function printLine({ document, wrap }: Printing, text: string, { x, y, style, align, goTo, link }: LineAt): void {
  const width = align === 'right' || goTo ? wrap.width(text, style) : 0;
  const left = align === 'right' ? x - width : x;
  const baseline = y + style.leading / 2 + style.size * 0.34;
  document.font(style.font, style.size).fillColor(style.colour);
  // the space at the end prints nothing, and lets the last word be the one that was measured
  document.text(`${text} `, left, baseline, { lineBreak: false, baseline: 'alphabetic' });
  // the types do not know `structParent`, by which a link is read out as one
  const annotation = { Border: [0, 0, 0], structParent: link };
  if (goTo) document.goTo(left, y, width, style.leading, goTo, annotation);
}

/** The finished bytes; they depend on nothing but what was printed. */
export function bytesOf(document: PDFKit.PDFDocument): Promise<Buffer> {
  const chunks: Buffer[] = [];
  document.on('data', (chunk: Buffer) => chunks.push(chunk));
  const done = new Promise<Buffer>((resolve, reject) => {
    document.on('end', () => resolve(Buffer.concat(chunks))).on('error', reject);
  });
  document.end();
  return done;
}

/** From the top of a page, in the way of PDF's own destinations. */
export const fromTop = (y: number): number => Math.min(page.height, Math.max(0, y));
