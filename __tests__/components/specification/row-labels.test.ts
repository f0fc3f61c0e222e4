import { byLabel, nextLabel } from '@/components/specification/row-labels';

const rows = (...labels: string[]) => labels.map((label) => ({ label }));

it('orders rows as a person counts', () => {
  expect(
    rows('P10', 'Q1', 'P9', 'P09a')
      .sort(byLabel)
      .map(({ label }) => label),
  ).toEqual(['P9', 'P09a', 'P10', 'Q1']);
});

it('goes on from the last number, with as many digits', () => {
  expect(nextLabel(rows('P08', 'P09'))).toBe('P10');
  expect(nextLabel(rows('P01', 'T04'))).toBe('T05');
  expect(nextLabel(rows('9'))).toBe('10');
  expect(nextLabel(rows('pipes'))).toBe('');
  expect(nextLabel([])).toBe('');
});
