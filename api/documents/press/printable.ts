import { z } from 'zod';

// pdfkit does not say which glyphs a font has; the font that it opened does.
const openedFont = z.object({ font: z.object({ characterSet: z.array(z.number()) }) });

/** Puts text into signs that the type can print. What it cannot print stands as "?", and `replaced` tells so. */
export type Printable = { of: (text: string) => string; replaced: () => boolean };

export function createPrintable(document: PDFKit.PDFDocument): Printable {
  const opened: unknown = Reflect.get(document.font('regular'), '_font');
  const known = new Set(openedFont.parse(opened).font.characterSet);
  let replaced = false;
  const isKnown = (text: string) =>
    [...text].every((each) => each === '\n' || known.has(each.codePointAt(0) ?? 0)) && text.search(invisible) < 0;
  const sign = (given: string): string => {
    const cluster = given === '\n' ? given : given.replace(invisible, '');
    if (cluster === '\n' || [...cluster].every((each) => known.has(each.codePointAt(0) ?? 0))) return cluster;
    replaced = true;
    return '?';
  };
  return {
    of: (text) => {
      if (plain.test(text)) return text;
      const clean = spaced(text);
      return isKnown(clean) ? clean : clusters(clean).map(sign).join('');
    },
    replaced: () => replaced,
  };
}

const segmenter = new Intl.Segmenter('en', { granularity: 'grapheme' });
/** What a person sees as one sign: an emoji of several code points is one. */
export const clusters = (text: string): string[] => Array.from(segmenter.segment(text), ({ segment }) => segment);

const plain = /^[\x20-\x7e\n]*$/;
const spaced = (text: string) =>
  text
    .normalize('NFC')
    .replace(/[\t\r\f]/g, ' ')
    .replace(/(?! )\p{Zs}/gu, '\u00a0');
// joiners and direction marks print nothing, and could turn the rest of a line round
const invisible = /[\p{Cf}\p{Cc}\p{Zl}\p{Zp}\ufe00-\ufe0f]/gu;
