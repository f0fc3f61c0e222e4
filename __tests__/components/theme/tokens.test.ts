import { light, night, type Colours } from '@/components/theme/tokens';

/** Contrast by WCAG 2.2: relative luminance (definition in its glossary), (L1 + 0.05) / (L2 + 0.05). */
function contrast(one: string, other: string): number {
  const [dark, bright] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return ((bright ?? 0) + 0.05) / ((dark ?? 0) + 0.05);
}
function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((share) => (share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

const onPaper = ['ink', 'inkSoft', 'oxide', 'hot', 'cold', 'pass', 'caution', 'fail'] as const;

describe.each([
  ['light', light],
  ['night', night],
])('%s', (_name, colours: Colours) => {
  it('measures black on white as 21, as WCAG says', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 5);
  });
  it.each(onPaper)('%s can be read on paper and on a sheet (4.5:1, WCAG 1.4.3)', (name) => {
    expect(contrast(colours[name], colours.paper)).toBeGreaterThanOrEqual(4.5);
    expect(contrast(colours[name], colours.sheet)).toBeGreaterThanOrEqual(4.5);
  });
  it.each(['oxide', 'fail'] as const)('words on %s can be read', (name) => {
    expect(contrast(colours.onAction, colours[name])).toBeGreaterThanOrEqual(4.5);
  });
});
