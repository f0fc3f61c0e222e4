import type { Job } from '@/api/contracts/job';
import type { Judgement } from '@/api/contracts/judgement';
import type { Revision } from '@/api/contracts/revision';
import type { Run } from '@/api/contracts/run';
import { Link } from '@/components/ui/link';
import { Stack } from '@/components/ui/stack';
import { Text, Words } from '@/components/ui/text';
import { useNow } from '@/hooks/use-now';
import { useUnits } from '@/hooks/use-units';

import { countdown, dueText, instantOf, plural } from './due-words';
import { flaggedRuns, listText, revisionText, takenOffText, type Flagged } from './standing';

type JobSentencesProps = {
  job: Job;
  timeZone: string;
  runs?: readonly Run[];
  judgement?: Judgement;
  revisions?: readonly Revision[];
};

/** How a job stands: until when, how much of it is taken off, what stands against it, what went out. */
export function JobSentences({ job, timeZone, runs, judgement, revisions }: JobSentencesProps) {
  return (
    <Stack gap="xs">
      <Due job={job} />
      {runs ? <TakenOff jobId={job.id} runs={runs} /> : null}
      {runs && judgement ? (
        <Standing jobId={job.id} flagged={flaggedRuns(runs, judgement)} isAny={runs.length > 0} />
      ) : null}
      {revisions ? <Sent jobId={job.id} newest={revisions[0]} timeZone={timeZone} /> : null}
    </Stack>
  );
}

function Due({ job: { bidDue } }: { job: Job }) {
  const now = useNow();
  if (!bidDue) return <Text size="sentence">No date is set for the bid.</Text>;
  const { text, standing } = countdown(instantOf(bidDue), now);
  return (
    <Text size="sentence">
      {standing === 'past' ? 'The bid was due ' : 'The bid is due '}
      {`${dueText(bidDue, now)}, `}
      <Words weight="strong" tone={standing === 'today' ? 'fail' : undefined} noWrap>
        {text}
      </Words>
      .
    </Text>
  );
}

function TakenOff({ jobId, runs }: { jobId: string; runs: readonly Run[] }) {
  const { units } = useUnits();
  if (runs.length === 0) return <Text size="sentence">Nothing is taken off yet.</Text>;
  return (
    <Text size="sentence">
      {`${takenOffText(runs, units)} ${runs.length === 1 ? 'is' : 'are'} `}
      <Link href={`/jobs/${jobId}/runs`} label="taken off" size="sentence" inline />.
    </Text>
  );
}

function Standing({ jobId, flagged, isAny }: { jobId: string; flagged: Flagged; isAny: boolean }) {
  if (!isAny) return null;
  const { notMet, onHold, open } = flagged;
  return (
    <Text size="sentence">
      {notMet.length > 0 ? (
        <>
          <Link
            href={`/jobs/${jobId}/flags`}
            label={plural(notMet.length, 'run')}
            size="sentence"
            tone="fail"
            strong
            inline
          />
          {` ${notMet.length === 1 ? 'does' : 'do'} not meet a limit. `}
        </>
      ) : (
        'Every run that is judged meets its limits. '
      )}
      {onHold.length > 0 ? `${listText(onHold)} ${onHold.length === 1 ? 'is' : 'are'} on hold. ` : null}
      {open.length > 0 ? `Nothing says how to insulate ${listText(open)}, or it cannot be calculated.` : null}
    </Text>
  );
}

function Sent({ jobId, newest, timeZone }: { jobId: string; newest?: Revision; timeZone: string }) {
  return (
    <Text size="sentence">
      {newest ? revisionText(newest, timeZone) : 'Nothing is frozen or sent yet.'}{' '}
      {newest ? <Link href={`/jobs/${jobId}/documents`} label="Documents" size="sentence" inline /> : null}
    </Text>
  );
}
