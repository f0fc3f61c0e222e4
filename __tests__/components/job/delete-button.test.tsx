import { act, fireEvent, render, screen } from '@testing-library/react';

import { DeleteButton } from '@/components/job/delete-button';
import { RequestFailed } from '@/hooks/request';

const press = (text: string) => act(async () => void fireEvent.click(screen.getByText(text)));

function show(change: { uses?: string[]; remove?: () => Promise<void> }) {
  const deleted = jest.fn();
  const remove = jest.fn(change.remove ?? (async () => undefined));
  render(<DeleteButton noun="place" name="Roof" uses={change.uses} onDelete={remove} onDeleted={deleted} />);
  return { remove, deleted };
}

it('says what stands on it, and deletes nothing then', async () => {
  const { remove } = show({ uses: ['2 runs: R38, R39', '1 build-up'] });
  await press('Delete');
  expect(screen.getByText('2 runs: R38, R39')).toBeTruthy();
  expect(screen.getByText('1 build-up')).toBeTruthy();
  expect(remove).not.toHaveBeenCalled();
});

it('asks before it deletes, and may be kept', async () => {
  const { remove } = show({});
  await press('Delete');
  expect(screen.getByText('Delete Roof?')).toBeTruthy();
  await press('Keep it');
  expect(screen.queryByText('Delete Roof?')).toBeNull();
  expect(remove).not.toHaveBeenCalled();
});

it('deletes when told so', async () => {
  const { remove, deleted } = show({});
  await press('Delete');
  await act(async () => void fireEvent.click(screen.getAllByText('Delete').at(-1)!));
  expect(remove).toHaveBeenCalledTimes(1);
  expect(deleted).toHaveBeenCalledTimes(1);
});

it("shows the server's reason when it refuses", async () => {
  const detail = '3 runs use this place';
  const problem = { type: '/problems/conflict', title: 'Does not go together', status: 409, detail };
  const { deleted } = show({ remove: () => Promise.reject(new RequestFailed(problem)) });
  await press('Delete');
  await act(async () => void fireEvent.click(screen.getAllByText('Delete').at(-1)!));
  expect(screen.getByText('Not deleted. 3 runs use this place')).toBeTruthy();
  expect(deleted).not.toHaveBeenCalled();
});
