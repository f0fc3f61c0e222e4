import type { Job } from '@/api/contracts/job';
import type { Judgement } from '@/api/contracts/judgement';
import type { Revision } from '@/api/contracts/revision';
import { EmptyState } from '@/components/ui/empty-state';
import { Row } from '@/components/ui/stack';
import { useRevisionActions } from '@/hooks/use-revisions';
import { useMay } from '@/hooks/use-session';

import { FreezeButton } from './freeze-button';
import { PdfLink } from './pdf-link';
import { RevisionList } from './revision-list';

type DocumentsViewProps = { job: Job; judgement: Judgement; revisions: readonly Revision[]; timeZone: string };

/** What can be frozen now, and what was. */
export function DocumentsView({ job, judgement, revisions, timeZone }: DocumentsViewProps) {
  const { freeze } = useRevisionActions(job.id);
  const mayFreeze = useMay('revise');
  const hasRuns = judgement.runs.length > 0;
  return (
    <>
      {hasRuns ? (
        <Row>
          {mayFreeze ? <FreezeButton revisions={revisions} judgement={judgement} onFreeze={freeze} /> : null}
          <PdfLink path={`/jobs/${job.id}/draft.pdf`} label="Draft as it would be now" />
        </Row>
      ) : null}
      {revisions.length > 0 ? (
        <RevisionList job={job} revisions={revisions} timeZone={timeZone} />
      ) : (
        <EmptyState title="Nothing is frozen yet">{hasRuns ? whatFreezingDoes : whatIsMissing}</EmptyState>
      )}
    </>
  );
}

const whatFreezingDoes = 'Freezing keeps the job as it stands under a letter, makes its PDF, and lets you send it.';
const whatIsMissing = 'Enter runs first: a revision holds their schedule, quantities and clarifications.';
