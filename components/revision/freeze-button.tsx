import { useState } from 'react';

import { problemOf } from '@/components/forms/show-problem';
import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { useToast } from '@/components/ui/toast';

type FreezeButtonProps = { letter: string; runs: number; flags: number; onFreeze: () => Promise<unknown> };

/** Freezing commits what stands now under the next letter; nothing recomputes it afterwards. */
export function FreezeButton({ letter, runs, flags, onFreeze }: FreezeButtonProps) {
  const [asks, setAsks] = useState(false);
  const [busy, setBusy] = useState(false);
  const toast = useToast();
  const freeze = async () => {
    setBusy(true);
    try {
      await onFreeze();
      toast({ text: `Revision ${letter} is frozen. Its PDF is being made.` });
    } catch (error) {
      toast({ text: `Not frozen: ${problemOf(error)?.detail ?? problemOf(error)?.title ?? 'something went wrong'}` });
    } finally {
      setBusy(false);
      setAsks(false);
    }
  };
  return (
    <>
      <Button label={`Freeze Revision ${letter}`} tone="action" onPress={() => setAsks(true)} />
      {asks ? (
        <ConfirmDialog
          title={`Freeze Revision ${letter}?`}
          confirm={`Freeze Revision ${letter}`}
          tone="action"
          busy={busy}
          onConfirm={() => void freeze()}
          onCancel={() => setAsks(false)}
        >
          {`${runs} runs as they stand now, with ${flags} ${flags === 1 ? 'flag' : 'flags'} printed as clarifications. Later edits go into the next revision; an earlier one is superseded.`}
        </ConfirmDialog>
      ) : null}
    </>
  );
}
