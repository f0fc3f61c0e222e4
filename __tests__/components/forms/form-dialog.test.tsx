import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';

import { FormDialog } from '@/components/forms/form-dialog';
import { FormTextField } from '@/components/forms/form-text-field';
import { plainResolver } from '@/components/forms/plain-resolver';

const schema = z.object({ name: z.string().min(1, 'Must be filled in') });

function LevelDialog({ close, save }: { close: () => void; save: (input: { name: string }) => Promise<unknown> }) {
  const form = useForm({ resolver: plainResolver(schema), defaultValues: { name: 'Level 3' } });
  return (
    <FormDialog form={form} title="Level" saveLabel="Save the level" onClose={close} onSave={save}>
      <FormTextField control={form.control} name="name" label="Name" />
    </FormDialog>
  );
}
const escape = () => fireEvent.keyDown(screen.getByLabelText('Name'), { key: 'Escape' });

it('closes at once when nothing was changed', () => {
  const close = jest.fn();
  render(<LevelDialog close={close} save={jest.fn()} />);
  escape();
  expect(close).toHaveBeenCalledTimes(1);
});

it('asks first when something was', () => {
  const close = jest.fn();
  render(<LevelDialog close={close} save={jest.fn()} />);
  fireEvent.change(screen.getByLabelText('Name'), { target: { value: 'Level 4' } });
  escape();
  expect(close).not.toHaveBeenCalled();
  // Escape answers the question, not the form behind it
  fireEvent.keyDown(screen.getByRole('alertdialog'), { key: 'Escape' });
  expect(screen.queryByRole('alertdialog')).toBeNull();
  expect(close).not.toHaveBeenCalled();
  expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('Level 4');
  escape();
  fireEvent.click(screen.getByRole('button', { name: 'Leave without saving' }));
  expect(close).toHaveBeenCalledTimes(1);
});

it('saves by its button, which stands outside of the form', async () => {
  const save = jest.fn().mockResolvedValue(undefined);
  render(<LevelDialog close={jest.fn()} save={save} />);
  fireEvent.change(screen.getByLabelText('Name'), { target: { value: 'Level 4' } });
  fireEvent.click(screen.getByRole('button', { name: 'Save the level' }));
  await waitFor(() => expect(save).toHaveBeenCalledWith({ name: 'Level 4' }));
});
