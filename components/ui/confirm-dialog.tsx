import { Button } from './button';
import { Dialog } from './dialog';
import { Text } from './text';

type ConfirmDialogProps = {
  /** the question: "Remove level 3?" */
  title: string;
  /** what follows from a yes, and what is kept */
  children: string;
  /** the verb, not "OK" */
  confirm: string;
  cancel?: string;
  tone?: 'action' | 'danger';
  busy?: boolean;
  onConfirm: () => void;
  onCancel: () => void;
};

/** Asks before what cannot be taken back; the focus begins on the way out. */
export function ConfirmDialog({
  title,
  children,
  confirm,
  cancel = 'Cancel',
  tone = 'danger',
  ...does
}: ConfirmDialogProps) {
  const { busy, onConfirm, onCancel } = does;
  return (
    <Dialog
      title={title}
      question
      onClose={onCancel}
      footer={
        <>
          <Button label={cancel} onPress={onCancel} />
          <Button label={confirm} tone={tone} busy={busy} onPress={onConfirm} />
        </>
      }
    >
      <Text>{children}</Text>
    </Dialog>
  );
}
