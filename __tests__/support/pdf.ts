import { execFileSync } from 'node:child_process';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';

/** Poppler's programs read back what was printed: another implementation than the one that printed it. */
function withFile<Result>(bytes: Buffer, work: (file: string, folder: string) => Result): Result {
  const folder = fs.mkdtempSync(path.join(os.tmpdir(), 'pdf-'));
  try {
    const file = path.join(folder, 'document.pdf');
    fs.writeFileSync(file, bytes);
    return work(file, folder);
  } finally {
    fs.rmSync(folder, { recursive: true });
  }
}

const read = (program: string, args: string[]) => execFileSync(program, args, { encoding: 'utf8', maxBuffer: 64e6 });

/** The text of each page, laid out as printed. */
export const pagesOf = (bytes: Buffer): string[] =>
  withFile(bytes, (file) => read('pdftotext', ['-layout', '-enc', 'UTF-8', file, '-']))
    .split('\f')
    .slice(0, -1);

/** All text in reading order, wrapped lines joined. */
export const textOf = (bytes: Buffer): string =>
  withFile(bytes, (file) => read('pdftotext', ['-enc', 'UTF-8', file, '-'])).replace(/\s+/g, ' ');

export const factsOf = (bytes: Buffer): string => withFile(bytes, (file) => read('pdfinfo', ['-isodates', file]));
export const structureOf = (bytes: Buffer): string => withFile(bytes, (file) => read('pdfinfo', ['-struct', file]));
export const destinationsOf = (bytes: Buffer): string => withFile(bytes, (file) => read('pdfinfo', ['-dests', file]));

/** Each page as grey pixels, 0 black to 255 white. */
export const pixelsOf = (bytes: Buffer): Buffer[] =>
  withFile(bytes, (file, folder) => {
    execFileSync('pdftoppm', ['-r', '24', '-gray', file, path.join(folder, 'page')]);
    const pages = fs.readdirSync(folder).filter((name) => name.endsWith('.pgm'));
    return pages.sort().map((name) => fs.readFileSync(path.join(folder, name)).subarray(15));
  });
