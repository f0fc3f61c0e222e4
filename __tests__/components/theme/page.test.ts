import fs from 'node:fs';
import path from 'node:path';

import { light, night } from '@/components/theme/tokens';

const read = (file: string) => fs.readFileSync(path.resolve(__dirname, '../../../public', file), 'utf8');
const hexes = (text: string) => [...new Set(text.match(/#[0-9a-f]{6}\b/gi)?.map((hex) => hex.toUpperCase()))];

// the page is painted before the app can say its colours
it('has the paper of both themes and no other colour in the page itself', () => {
  expect(hexes(read('index.html')).sort()).toEqual([light.paper, night.paper].sort());
});

it('has the light paper in the manifest, and the mark in the accent', () => {
  expect(hexes(read('manifest.webmanifest'))).toEqual([light.paper]);
  expect(hexes(read('icon.svg')).sort()).toEqual([light.oxide, light.paper].sort());
});

it('serves each weight of the one typeface from here', () => {
  const css = read('fonts/fonts.css');
  expect(css.match(/font-weight: \d+/g)).toEqual(['font-weight: 400', 'font-weight: 600', 'font-weight: 700']);
  expect(css.match(/url\('([^']*)'\)/g)?.every((url) => url.startsWith("url('/fonts/"))).toBe(true);
});
