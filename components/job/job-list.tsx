import type { JobSummary } from '@/api/contracts/job';
import { useLayout } from '@/components/theme/use-layout';
import { Card } from '@/components/ui/card';
import { DataTable, type Column } from '@/components/ui/data-table';
import { LinkArea } from '@/components/ui/link';
import { Mark } from '@/components/ui/mark';
import { Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { DueLine } from './due-line';
import { plural } from './due-words';

export function JobList({ jobs }: { jobs: readonly JobSummary[] }) {
  const { isPhone } = useLayout();
  return isPhone ? <JobCards jobs={jobs} /> : <JobTable jobs={jobs} />;
}

const columns: readonly Column<JobSummary>[] = [
  { key: 'number', label: 'Number', cell: ({ number }) => number },
  { key: 'name', label: 'Job and site', cell: (job) => <NameAndSite job={job} /> },
  { key: 'due', label: 'Bid due', cell: ({ bidDue }) => <DueLine due={bidDue} /> },
  { key: 'runs', label: 'Runs', numeric: true, cell: ({ runs }) => runs },
  { key: 'hold', label: 'On hold', cell: ({ onHold }) => <Held count={onHold} /> },
  { key: 'revision', label: 'Last revision', cell: ({ lastRevision }) => <Revision letter={lastRevision} /> },
];

const JobTable = ({ jobs }: { jobs: readonly JobSummary[] }) => (
  <DataTable label="Jobs" columns={columns} rows={jobs} keyOf={({ id }) => id} hrefOf={({ id }) => `/jobs/${id}`} />
);

const JobCards = ({ jobs }: { jobs: readonly JobSummary[] }) => (
  <Stack gap="xs" role="list" aria-label="Jobs">
    {jobs.map((job) => (
      <Card key={job.id} role="listitem">
        <LinkArea href={`/jobs/${job.id}`}>
          <Stack gap="xxs">
            <Text size="small" tone="inkSoft">
              {job.number}
            </Text>
            <Text size="lead" weight="strong">
              {job.name}
            </Text>
            {job.site ? <Text tone="inkSoft">{job.site}</Text> : null}
            <DueLine due={job.bidDue} />
            <Row gap="md">
              <Text tone="inkSoft">{plural(job.runs, 'run')}</Text>
              <Held count={job.onHold} />
              <Revision letter={job.lastRevision} />
            </Row>
          </Stack>
        </LinkArea>
      </Card>
    ))}
  </Stack>
);

const NameAndSite = ({ job: { name, site } }: { job: JobSummary }) => (
  <Stack gap="xxs">
    <Text weight="strong">{name}</Text>
    {site ? (
      <Text size="small" tone="inkSoft">
        {site}
      </Text>
    ) : null}
  </Stack>
);

const Held = ({ count }: { count: number }) =>
  count > 0 ? <Mark verdict="caution" words={`${count} on hold`} size="body" /> : null;

const Revision = ({ letter }: { letter: string | null }) => (
  <Text tone={letter ? 'ink' : 'inkSoft'}>{letter ? `Revision ${letter}` : 'none yet'}</Text>
);
