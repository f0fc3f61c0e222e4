import { useState } from 'react';

import { problemOf } from '@/components/forms/show-problem';
import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { Dialog } from '@/components/ui/dialog';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useToast } from '@/components/ui/toast';

type DeleteButtonProps = {
  /** "place", "service" */
  noun: string;
  /** how this one is called */
  name: string;
  /** what stands on it: then it cannot go */
  uses?: readonly string[];
  /** what follows from it, where something does */
  consequence?: string;
  onDelete: () => Promise<void>;
  onDeleted: () => void;
};

/** Asks first, and says what stands in the way. */
export function DeleteButton({ noun, name, uses = [], ...does }: DeleteButtonProps) {
  const [isOpen, setOpen] = useState(false);
  const close = () => setOpen(false);
  return (
    <>
      <Button label="Delete" name={`Delete ${noun} ${name}`} onPress={() => setOpen(true)} />
      {isOpen && uses.length > 0 ? <InUse noun={noun} name={name} uses={uses} onClose={close} /> : null}
      {isOpen && uses.length === 0 ? <AskDelete noun={noun} name={name} {...does} onCancel={close} /> : null}
    </>
  );
}

type InUseProps = { noun: string; name: string; uses: readonly string[]; onClose: () => void };

function InUse({ noun, name, uses, onClose }: InUseProps) {
  return (
    <Dialog title={`${name} is in use`} onClose={onClose}>
      <Text>{`These stand on this ${noun}. Point them elsewhere or delete them first.`}</Text>
      <Stack gap="xxs" role="list">
        {uses.map((line) => (
          <Text key={line} role="listitem">
            {line}
          </Text>
        ))}
      </Stack>
    </Dialog>
  );
}

type AskDeleteProps = Omit<DeleteButtonProps, 'uses'> & { onCancel: () => void };

function AskDelete({ noun, name, consequence, onDelete, onDeleted, onCancel }: AskDeleteProps) {
  const [isBusy, setBusy] = useState(false);
  const [refused, setRefused] = useState<string>();
  const toast = useToast();
  const go = async () => {
    setBusy(true);
    try {
      await onDelete();
      toast({ text: `${name} is deleted.` });
      onDeleted();
    } catch (error) {
      const problem = problemOf(error);
      if (!problem) throw error;
      setRefused(problem.detail ?? problem.title);
      setBusy(false);
    }
  };
  return (
    <ConfirmDialog
      title={`Delete ${name}?`}
      confirm="Delete"
      cancel="Keep it"
      busy={isBusy}
      onConfirm={() => void go()}
      onCancel={onCancel}
    >
      {refused
        ? `Not deleted. ${refused}`
        : `${consequence ?? `Nothing stands on this ${noun}.`} It cannot be brought back.`}
    </ConfirmDialog>
  );
}
