import { act, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';

import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { Dialog } from '@/components/ui/dialog';
import { TextField } from '@/components/ui/text-field';
import { ToastProvider, useToast, type Toast } from '@/components/ui/toast';

function Editor() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button label="Edit" onPress={() => setOpen(true)} />
      {open ? (
        <Dialog title="Level 3" onClose={() => setOpen(false)}>
          <TextField label="Name" value="" onChange={() => undefined} />
        </Dialog>
      ) : null}
    </>
  );
}

describe('Dialog', () => {
  it('takes the focus to its first field, and gives it back when Escape closes it', () => {
    render(<Editor />);
    const opener = screen.getByRole('button', { name: 'Edit' });
    opener.focus();
    fireEvent.click(opener);
    const dialog = screen.getByRole('dialog', { name: 'Level 3' });
    expect(document.activeElement).toBe(screen.getByLabelText('Name'));
    fireEvent.keyDown(dialog, { key: 'Escape' });
    expect(screen.queryByRole('dialog')).toBeNull();
    expect(document.activeElement).toBe(opener);
  });
  it('closes by its button', () => {
    render(<Editor />);
    fireEvent.click(screen.getByRole('button', { name: 'Edit' }));
    fireEvent.click(screen.getByRole('button', { name: 'Close' }));
    expect(screen.queryByRole('dialog')).toBeNull();
  });
});

describe('ConfirmDialog', () => {
  it('begins on the way out, so that Enter removes nothing by mistake', () => {
    const [confirm, cancel] = [jest.fn(), jest.fn()];
    render(
      <ConfirmDialog title="Remove level 3?" confirm="Remove" onConfirm={confirm} onCancel={cancel}>
        Its 14 runs go with it.
      </ConfirmDialog>,
    );
    expect(document.activeElement?.textContent).toBe('Cancel');
    fireEvent.keyDown(screen.getByRole('alertdialog', { name: 'Remove level 3?' }), { key: 'Escape' });
    expect(cancel).toHaveBeenCalledTimes(1);
    fireEvent.click(screen.getByRole('button', { name: 'Remove' }));
    expect(confirm).toHaveBeenCalledTimes(1);
  });
});

function Teller({ toast }: { toast: Toast }) {
  const tell = useToast();
  return <Button label="Do it" onPress={() => tell(toast)} />;
}

describe('toast', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());
  const show = (toast: Toast) => {
    render(
      <ToastProvider>
        <Teller toast={toast} />
      </ToastProvider>,
    );
    fireEvent.click(screen.getByRole('button', { name: 'Do it' }));
  };

  it('is said in a region that was there before, and goes by itself', () => {
    show({ text: 'Run R30 removed' });
    expect(screen.getByRole('status').textContent).toContain('Run R30 removed');
    act(() => jest.advanceTimersByTime(6100));
    expect(screen.queryByText('Run R30 removed')).toBeNull();
  });
  it('takes it back when asked, and is gone then', () => {
    const undo = jest.fn();
    show({ text: 'Run R30 removed', action: { label: 'Undo', onPress: undo } });
    act(() => jest.advanceTimersByTime(6100));
    fireEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(undo).toHaveBeenCalledTimes(1);
    expect(screen.queryByText('Run R30 removed')).toBeNull();
  });
  it('waits as long as someone is on it', () => {
    show({ text: 'Run R30 removed', action: { label: 'Undo', onPress: () => undefined } });
    fireEvent.focus(screen.getByRole('button', { name: 'Undo' }));
    act(() => jest.advanceTimersByTime(60_000));
    expect(screen.getByText('Run R30 removed')).toBeTruthy();
  });
});
