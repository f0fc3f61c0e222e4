import { useLocalSearchParams } from 'expo-router';

import { DocumentsView } from '@/components/revision/documents-view';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useJob } from '@/hooks/use-job';
import { useJudgement } from '@/hooks/use-judgement';
import { useRevisions } from '@/hooks/use-revisions';
import { useSession } from '@/hooks/use-session';

export default function DocumentsScreen() {
  const { job: jobId } = useLocalSearchParams<{ job: string }>();
  const { session } = useSession();
  const { job } = useJob(jobId);
  const { judgement } = useJudgement(jobId);
  const { revisions, problem, reload } = useRevisions(jobId);
  if (problem && !revisions) return <ProblemScreen problem={problem} onRetry={reload} />;
  if (!revisions || !job || !judgement || !session) return <LoadingScreen title="Documents" />;
  const timeZone = job.bidDue?.zone ?? session.firm.timeZone;
  return (
    <Screen title="Documents" lead="A revision is frozen, then sent. A draft never leaves.">
      <DocumentsView job={job} judgement={judgement} revisions={revisions} timeZone={timeZone} />
    </Screen>
  );
}
