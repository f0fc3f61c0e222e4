import { StyleSheet, View } from 'react-native';

import type { Job } from '@/api/contracts/job';
import { space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { FactList } from '@/components/ui/fact-list';
import { Link } from '@/components/ui/link';
import { Loading } from '@/components/ui/loading';
import { Notice } from '@/components/ui/notice';
import { ProblemWords } from '@/components/ui/problem-words';
import { Stack } from '@/components/ui/stack';
import { useContacts } from '@/hooks/use-contacts';
import { useJudgement } from '@/hooks/use-judgement';
import { useCodes } from '@/hooks/use-library';
import { useRevisions } from '@/hooks/use-revisions';
import { useRuns } from '@/hooks/use-runs';
import { useMay, useSession } from '@/hooks/use-session';
import { useUnits } from '@/hooks/use-units';

import { jobFacts } from './job-facts';
import { JobSection } from './job-section';
import { JobSentences } from './job-sentences';
import { useJobSections } from './use-job-sections';

/** The job at a glance: how it stands in sentences, what it holds, what it says about itself. */
export function JobOverview({ job }: { job: Job }) {
  const { isSplit } = useLayout();
  return (
    <View style={[styles.overview, isSplit && styles.split]}>
      <View style={[styles.main, isSplit && styles.mainBeside]}>
        <Standing job={job} />
        <Sections jobId={job.id} />
      </View>
      <View style={isSplit ? styles.side : undefined}>
        <Facts job={job} />
      </View>
    </View>
  );
}

function Standing({ job }: { job: Job }) {
  const { session } = useSession();
  const { runs } = useRuns(job.id);
  const { judgement, problem } = useJudgement(job.id);
  const { revisions } = useRevisions(job.id);
  const timeZone = session?.firm.timeZone ?? 'UTC';
  return (
    <Stack gap="sm">
      <JobSentences {...{ job, timeZone, runs, judgement, revisions }} />
      {problem && !judgement ? (
        <Notice tone="fail" title="The runs could not be judged">
          {problem.detail ?? problem.title}
        </Notice>
      ) : null}
    </Stack>
  );
}

function Sections({ jobId }: { jobId: string }) {
  const { sections, problem } = useJobSections(jobId);
  const mayEdit = useMay('edit-jobs');
  if (!sections) return problem ? <ProblemWords problem={problem} /> : <Loading label="What the job holds" />;
  return (
    <View>
      {sections.map((section) => (
        <JobSection key={section.title} section={section} mayEdit={mayEdit} />
      ))}
    </View>
  );
}

function Facts({ job }: { job: Job }) {
  const { units } = useUnits();
  const { contacts = [] } = useContacts();
  const { data: codes = [] } = useCodes();
  const mayEdit = useMay('edit-jobs');
  const facts = jobFacts(job, { units, contacts, codes }).filter(({ term, value }) => value && !known.has(term));
  return (
    <Stack gap="xs">
      {job.contactIds.length === 0 ? (
        <Notice title="No client yet">
          A revision is sent to the contacts that the job names. Choose them in the job’s details.
        </Notice>
      ) : null}
      <FactList facts={facts} termWidth={116} />
      {mayEdit ? <Link href={`/jobs/${job.id}/edit`} label="Change these" /> : null}
    </Stack>
  );
}

// the head of the screen and its first sentence say them
const known = new Set(['Number', 'Name', 'Site', 'Bid due']);

const styles = StyleSheet.create({
  overview: { gap: space.xl },
  split: { flexDirection: 'row', alignItems: 'flex-start' },
  main: { gap: space.xl, minWidth: 0 },
  mainBeside: { flexGrow: 1, flexShrink: 1, flexBasis: 0, maxWidth: 780 },
  side: { width: 372, flexShrink: 0 },
});
