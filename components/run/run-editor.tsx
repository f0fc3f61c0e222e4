import { useState } from 'react';

import type { Run } from '@/api/contracts/run';
import { useLayout } from '@/components/theme/use-layout';
import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { LinkButton } from '@/components/ui/link';
import { Notice } from '@/components/ui/notice';
import { useToast } from '@/components/ui/toast';
import { useRunActions } from '@/hooks/use-runs';
import { useMay } from '@/hooks/use-session';

import { newRun, nextNumber } from './run-defaults';
import { RunForm } from './run-form';
import type { RunLookups, RunRow } from './run-row';

type RunEditorProps = {
  jobId: string;
  /** undefined: a new run */
  row: RunRow | undefined;
  rows: readonly RunRow[];
  lookups: RunLookups;
  onClose: () => void;
  onSaved: (run: Run) => void;
};

/** The form of one run, for who may change it. */
export function RunEditor(props: RunEditorProps) {
  const mayEdit = useMay('edit-jobs');
  if (!mayEdit) return <Notice title="For reading only">An estimator of your firm changes runs.</Notice>;
  return <Editor {...props} />;
}

/** With what else can be done with it: its study, another like it, removing it. */
function Editor({ jobId, row, rows, lookups, onClose, onSaved }: RunEditorProps) {
  const toast = useToast();
  const [copied, setCopied] = useState<Run>();
  const number = nextNumber(rows.map((one) => one.run.number));
  const begun = copied ? { ...copied, number } : newRun(rows.at(-1)?.run, number);
  const run = copied ? null : (row?.run ?? null);
  const saved = (stored: Run) => {
    toast({ text: `${stored.number} is saved.` });
    setCopied(undefined);
    onSaved(stored);
  };
  return (
    <RunForm
      key={`${run?.id} ${copied?.id}`}
      jobId={jobId}
      run={run}
      initial={run ?? begun}
      lookups={lookups}
      onSaved={saved}
      onCancel={onClose}
      actions={run ? <RunActions jobId={jobId} run={run} onCopy={() => setCopied(run)} onRemoved={onClose} /> : null}
    />
  );
}

type RunActionsProps = { jobId: string; run: Run; onCopy: () => void; onRemoved: () => void };

function RunActions({ jobId, run, onCopy, onRemoved }: RunActionsProps) {
  const [asks, setAsks] = useState(false);
  const [busy, setBusy] = useState(false);
  const toast = useToast();
  const { isPhone } = useLayout();
  const { remove, create } = useRunActions(jobId);
  const { id: _id, version: _version, ...input } = run;
  const removeIt = async () => {
    setBusy(true);
    try {
      await remove(run);
      const undo = () => void create(input, crypto.randomUUID());
      toast({ text: `${run.number} is removed.`, action: { label: 'Undo', onPress: undo } });
      onRemoved();
    } catch (error) {
      toast({ text: error instanceof Error ? `Not removed: ${error.message}` : 'Not removed.' });
    } finally {
      setBusy(false);
      setAsks(false);
    }
  };
  return (
    <>
      {isPhone ? null : (
        <LinkButton label="Study" href={{ pathname: '/jobs/[job]/runs/[run]', params: { job: jobId, run: run.id } }} />
      )}
      <Button label="Another like it" onPress={onCopy} />
      <Button label="Remove" name={`Remove run ${run.number}`} onPress={() => setAsks(true)} />
      {asks ? (
        <ConfirmDialog
          title={`Remove run ${run.number}?`}
          confirm="Remove"
          busy={busy}
          onConfirm={() => void removeIt()}
          onCancel={() => setAsks(false)}
        >
          Its length, fittings and note go with it. Revisions that were frozen keep it.
        </ConfirmDialog>
      ) : null}
    </>
  );
}
