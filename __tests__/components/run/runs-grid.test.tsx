import { fireEvent, render, screen, within } from '@testing-library/react';

import { aRow, aRun, judged, pipeOf } from '../../support/run-rows';
import { RunsView } from '@/components/run/runs-view';

// the section is drawn by a chunk of its own, which a test's document does not fetch
jest.mock('@/components/run/run-glyph', () => ({ RunGlyph: () => null }));
jest.mock('expo-router', () => ({ useLocalSearchParams: () => ({ job: 'job' }), useRouter: () => ({}), Link: 'a' }));

// A test's document lays nothing out: the grid is given a height, so that it draws rows.
beforeAll(() => {
  for (const [side, value] of [
    ['clientHeight', 800],
    ['clientWidth', 1024],
  ] as const)
    Object.defineProperty(HTMLElement.prototype, side, { configurable: true, value });
});

const rows = ['R02', 'R10', 'R01'].map((number, index) =>
  aRow(aRun({ number, shape: pipeOf(10 * (index + 1)) }), judged()),
);
const show = () => {
  const onOpen = jest.fn();
  render(
    <RunsView rows={rows} units="SI" chosenId={undefined} onOpen={onOpen} asCards={false} compact={false} narrowed />,
  );
  return onOpen;
};
const listed = () =>
  screen
    .getAllByRole('row')
    .slice(1)
    .map((row) => within(row).getAllByRole('cell')[1]?.textContent);

it('keeps the order of entry until a column is pressed, then sorts one way, the other way, and not at all', () => {
  show();
  expect(listed()).toEqual(['R02', 'R10', 'R01']);
  const head = screen.getByRole('button', { name: 'Run' });
  fireEvent.click(head);
  expect(listed()).toEqual(['R01', 'R02', 'R10']);
  expect(screen.getByRole('columnheader', { name: /Run/ }).getAttribute('aria-sort')).toBe('ascending');
  fireEvent.click(head);
  expect(listed()).toEqual(['R10', 'R02', 'R01']);
  fireEvent.click(head);
  expect(listed()).toEqual(['R02', 'R10', 'R01']);
});

it('opens the row that has the focus with Enter', () => {
  const onOpen = show();
  const [, , second] = screen.getAllByRole('row');
  fireEvent.keyDown(second!, { key: 'Enter' });
  expect(onOpen).toHaveBeenCalledWith(rows[1]);
});

it('says what the narrowed list adds up to', () => {
  show();
  expect(screen.getByText('3 runs · 60.0 m')).toBeTruthy();
});
