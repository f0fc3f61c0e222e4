import { thicknessText, wordsText } from '@/api/contracts/words-text';

it('puts a sentence in the units of its reader', () => {
  const words = [
    { thickness: ['in:1.5' as const] },
    ' is not enough: it would reach ',
    { kind: 'temperature' as const, value: 63.04 },
    '.',
  ];
  expect(wordsText(words, 'SI')).toBe('38 mm is not enough: it would reach 63.0 °C.');
  expect(wordsText(words, 'IP')).toBe('1-1/2 in is not enough: it would reach 145.5 °F.');
});

it('names layers from the inside out and keeps metric names metric', () => {
  expect(thicknessText(['in:2.5', 'in:2'], 'SI')).toBe('64 + 51 mm');
  expect(thicknessText(['in:2.5', 'in:2'], 'IP')).toBe('2-1/2 + 2 in');
  expect(thicknessText(['mm:50', 'in:1'], 'IP')).toBe('50 mm + 1 in');
});

it('says a whole limit whole, but only where it is whole in the reader’s units', () => {
  const limit = (value: number) => [{ kind: 'temperature' as const, value, digits: 0 }];
  expect(wordsText(limit(60), 'SI')).toBe('60 °C');
  expect(wordsText(limit(60), 'IP')).toBe('140 °F');
  expect(wordsText(limit(43), 'IP')).toBe('109.4 °F');
});
