import { useState } from 'react';

import type { Judgement } from '@/api/contracts/judgement';
import type { Revision } from '@/api/contracts/revision';
import { revisionLetter } from '@/api/contracts/revision-letter';
import { problemOf } from '@/components/forms/show-problem';
import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { useToast } from '@/components/ui/toast';

type FreezeButtonProps = { revisions: readonly Revision[]; judgement: Judgement; onFreeze: () => Promise<unknown> };

/** Freezing commits what stands now under the next letter; nothing recomputes it afterwards. */
export function FreezeButton({ revisions, judgement, onFreeze }: FreezeButtonProps) {
  const letter = revisionLetter(revisions.length + 1);
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
          {whatIsFrozen(judgement)}
        </ConfirmDialog>
      ) : null}
    </>
  );
}

function whatIsFrozen({ runs }: Judgement): string {
  const flags = runs.reduce((sum, run) => sum + run.flags.length, 0);
  const printed = `${flags} ${flags === 1 ? 'flag' : 'flags'} printed as clarifications`;
  return `${runs.length} runs as they stand now, with ${printed}. Later edits go into the next revision; an earlier one is superseded.`;
}
