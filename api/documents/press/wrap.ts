import type { Style } from './ink';
import { clusters, type Printable } from './printable';

/** Breaks text into lines that fit; words that are longer than a line are broken where they must. */
export type Wrap = {
  lines: (text: string, style: Style, width: number) => string[];
  width: (text: string, style: Style) => number;
};

export function createWrap(document: PDFKit.PDFDocument, printable: Printable): Wrap {
  const known = new Map<string, number>();
  const wordWidth = (word: string, { font, size }: Style): number => {
    const key = `${font} ${word}`;
    const stored = known.get(key);
    if (stored !== undefined) return (stored * size) / 1000;
    // pdfkit keeps a word's glyphs together with the space after it: measured so, they are set once
    const width = document.font(font, 1000).widthOfString(`${word} `) - document.widthOfString(' ');
    known.set(key, width);
    return (width * size) / 1000;
  };
  const width = (text: string, style: Style) =>
    text.split(' ').reduce((sum, word, index) => sum + wordWidth(word, style) + (index ? wordWidth(' ', style) : 0), 0);
  const fits = (text: string, { style, width: room }: Room) => width(text, style) <= room + 0.01;
  return {
    width,
    lines: (text, style, room) =>
      printable
        .of(text)
        .split('\n')
        .flatMap((line) => fill(line, { style, width: room, fits })),
  };
}

type Room = { style: Style; width: number };
type Filling = Room & { fits: (text: string, room: Room) => boolean };

function fill(text: string, filling: Filling): string[] {
  const lines: string[] = [];
  let current = '';
  for (const word of text.split(' ').flatMap((each) => pieces(each, filling))) {
    const longer = current ? `${current} ${word}` : word;
    if (current && !filling.fits(longer, filling)) {
      lines.push(current);
      current = word;
    } else current = longer;
  }
  return [...lines, current];
}

/** A word as it is, or in pieces that fit a line each. */
function pieces(word: string, filling: Filling): string[] {
  if (filling.fits(word, filling)) return [word];
  const parts: string[] = [];
  let current = '';
  for (const cluster of clusters(word)) {
    if (current && !filling.fits(current + cluster, filling)) {
      parts.push(current);
      current = '';
    }
    current += cluster;
  }
  return [...parts, current];
}
