import { useLocalSearchParams } from 'expo-router';

import { FreezeButton } from '@/components/revision/freeze-button';
import { nextLetter } from '@/components/revision/next-letter';
import { PdfLink } from '@/components/revision/pdf-link';
import { RevisionList } from '@/components/revision/revision-list';
import { EmptyState } from '@/components/ui/empty-state';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { Row } from '@/components/ui/stack';
import { useJob } from '@/hooks/use-job';
import { useJudgement } from '@/hooks/use-judgement';
import { useRevisionActions, useRevisions } from '@/hooks/use-revisions';
import { useMay, useSession } from '@/hooks/use-session';

export default function DocumentsScreen() {
  const { job: jobId } = useLocalSearchParams<{ job: string }>();
  const { session } = useSession();
  const { job } = useJob(jobId);
  const { judgement } = useJudgement(jobId);
  const { revisions, problem, reload } = useRevisions(jobId);
  const { freeze } = useRevisionActions(jobId);
  const mayFreeze = useMay('revise');
  if (problem && !revisions) return <ProblemScreen problem={problem} onRetry={reload} />;
  if (!revisions || !job || !judgement || !session) return <LoadingScreen title="Documents" />;
  const timeZone = job.bidDue?.zone ?? session.firm.timeZone;
  const letter = nextLetter(revisions.map((revision) => revision.letter));
  const flags = judgement.runs.reduce((sum, run) => sum + run.flags.length, 0);
  const hasRuns = judgement.runs.length > 0;
  return (
    <Screen title="Documents" lead="A revision is frozen, then sent. A draft never leaves.">
      <Row>
        {mayFreeze && hasRuns ? (
          <FreezeButton letter={letter} runs={judgement.runs.length} flags={flags} onFreeze={freeze} />
        ) : null}
        {hasRuns ? <PdfLink path={`/jobs/${jobId}/draft.pdf`} label="Draft as it would be now" /> : null}
      </Row>
      {revisions.length > 0 ? (
        <RevisionList job={job} revisions={revisions} timeZone={timeZone} />
      ) : (
        <EmptyState title="Nothing is frozen yet">
          {hasRuns
            ? 'Freezing keeps the job as it stands under a letter, makes its PDF, and lets you send it.'
            : 'Enter runs first: a revision holds their schedule, quantities and clarifications.'}
        </EmptyState>
      )}
    </Screen>
  );
}
