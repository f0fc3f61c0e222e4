import { useState } from 'react';

import { useLayout } from '@/components/theme/use-layout';
import { Button } from '@/components/ui/button';
import { LinkButton } from '@/components/ui/link';
import { Notice } from '@/components/ui/notice';
import { Row, Stack } from '@/components/ui/stack';

import { choicesOf, type Deciding } from './choices';
import { FinishDialog } from './finish-dialog';
import { notSaved } from './main-actions';
import { asSpecified } from './override';
import type { Standing } from './put-up';
import { StudyTableDialog } from './study-table-dialog';
import { useDepartures } from './use-departures';

type OtherActionsProps = { of: Deciding; title: string; standing: Standing; mayEdit: boolean };

/** The same as a table, another finish, the specification again. */
export function OtherActions({ of, title, standing, mayEdit }: OtherActionsProps) {
  const [open, setOpen] = useState<'table' | 'finish'>();
  const [problem, setProblem] = useState<string>();
  const depart = useDepartures(of.jobId);
  const { isPhone } = useLayout();
  const { back } = choicesOf(of, standing, 0);
  const close = () => setOpen(undefined);
  const goBack = () => {
    setProblem(undefined);
    depart(of.run, asSpecified(of.run), `${of.run.number} is as specified.`).catch((error: unknown) =>
      setProblem(notSaved(error)),
    );
  };
  return (
    <Stack gap="xs">
      {problem ? (
        <Notice tone="fail" title="Not saved" urgent>
          {problem}
        </Notice>
      ) : null}
      <Row>
        <Button label="As a table" onPress={() => setOpen('table')} />
        {mayEdit ? <Button label="Change the finish" onPress={() => setOpen('finish')} /> : null}
        {mayEdit && isPhone ? (
          <LinkButton label="Edit the run" href={`/jobs/${of.jobId}/runs/${of.run.id}/edit`} />
        ) : null}
        {mayEdit && back ? <Button label="Back to the specification" onPress={goBack} /> : null}
      </Row>
      {open === 'table' ? (
        <StudyTableDialog title={title} runStudy={of.runStudy} standing={standing} onClose={close} />
      ) : null}
      {open === 'finish' ? <FinishDialog {...of} onClose={close} /> : null}
    </Stack>
  );
}
