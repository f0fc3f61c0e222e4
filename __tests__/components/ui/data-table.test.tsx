import { fireEvent, render, screen, within } from '@testing-library/react';

import { DataTable, type Column } from '@/components/ui/data-table';

const mockPush = jest.fn();
jest.mock('expo-router', () => ({ ...jest.requireActual('expo-router'), useRouter: () => ({ push: mockPush }) }));

type Run = { number: string; service: string; length: number };
const runs: Run[] = [
  { number: 'R29', service: 'Steam', length: 140 },
  { number: 'R30', service: 'Steam', length: 86 },
];
const columns: readonly Column<Run>[] = [
  { key: 'number', label: 'Run', cell: ({ number }) => number },
  { key: 'service', label: 'Service', cell: ({ service }) => service },
  { key: 'length', label: 'Length', unit: 'm', numeric: true, cell: ({ length }) => length.toFixed(1) },
];
const table = (isLinked: boolean) =>
  render(
    <DataTable
      label="Runs"
      columns={columns}
      rows={runs}
      keyOf={({ number }) => number}
      hrefOf={isLinked ? ({ number }) => `/jobs/7/runs/${number}` : undefined}
      isChosen={({ number }) => number === 'R30'}
    />,
  );

beforeEach(() => mockPush.mockClear());

it('is a table with named columns, the unit in the head and not in the cells', () => {
  table(false);
  expect(screen.getByRole('table', { name: 'Runs' })).toBeTruthy();
  expect(screen.getAllByRole('columnheader').map(({ textContent }) => textContent)).toEqual([
    'Run',
    'Service',
    'Length m',
  ]);
  const row = within(screen.getAllByRole('row')[1]!);
  expect(row.getAllByRole('cell').map(({ textContent }) => textContent)).toEqual(['R29', 'Steam', '140.0']);
});

it('can be entered by keyboard where it moves sideways', () => {
  table(false);
  expect(screen.getByRole('region', { name: 'Runs' }).tabIndex).toBe(0);
});

it('leads from each row, by its first words and by any spot of it', () => {
  table(true);
  expect(screen.getByRole('link', { name: 'R29' }).getAttribute('href')).toBe('/jobs/7/runs/R29');
  fireEvent.click(screen.getByText('86.0'));
  expect(mockPush.mock.calls).toEqual([['/jobs/7/runs/R30']]);
});

it('marks the row that is open beside it', () => {
  table(true);
  const current = screen.getAllByRole('row', { current: true });
  expect(current.map(({ textContent }) => textContent)).toEqual(['R30Steam86.0']);
});
