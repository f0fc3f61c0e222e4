import fs from 'node:fs';
import path from 'node:path';
import subsetFont from 'subset-font';

import { root } from '../processes.mjs';

const weights = { 400: '400Regular', 600: '600SemiBold', 700: '700Bold' };
const ranges = [
  [0x20, 0x7e],
  [0xa0, 0x17f],
  [0x2010, 0x2015],
  [0x2018, 0x201e],
];
const signs = '•…′″€™‹›▲▼←↑→↓−√∞≈≠≤≥✓✗ΔΣΩαβγδεηθλμνπρστφψω⁰¹²³⁴⁵⁶⁷⁸⁹₀₁₂₃₄₅₆₇₈₉⅛⅜⅝⅞\u202f';
const span = ([from, to]) => String.fromCodePoint(...Array.from({ length: to - from + 1 }, (_, index) => from + index));

/** Web copies of the fonts that the PDF uses: Latin and the signs of the trade, woff2. */
export async function makeFonts() {
  const text = ranges.map(span).join('') + signs;
  const folder = path.join(root, 'public/fonts');
  fs.mkdirSync(folder, { recursive: true });
  for (const [weight, name] of Object.entries(weights)) {
    const file = `node_modules/@expo-google-fonts/source-sans-3/${name}/SourceSans3_${name}.ttf`;
    const font = await subsetFont(fs.readFileSync(path.join(root, file)), text, { targetFormat: 'woff2' });
    fs.writeFileSync(path.join(folder, `source-sans-3-${weight}.woff2`), font);
  }
}
