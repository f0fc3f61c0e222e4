import type { Href } from 'expo-router';
import type { ReactNode } from 'react';

import { useLayout } from '@/components/theme/use-layout';
import { EmptyState } from '@/components/ui/empty-state';
import { ListRows } from '@/components/ui/list-row';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { Mark } from '@/components/ui/mark';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useJob } from '@/hooks/use-job';
import { useMay } from '@/hooks/use-session';

import type { JobSection } from './sections';
import { useJobSections } from './use-job-sections';

type SectionScreenProps = {
  jobId: string;
  title: string;
  /** above what is listed: a search, a filter */
  tools?: ReactNode;
  /** all of it in one table, where there is room for one */
  children: ReactNode;
};

/** All of one kind in a job: a table where there is room, else a list, a first step where there is none. */
export function SectionScreen({ jobId, title, tools, children }: SectionScreenProps) {
  const { job } = useJob(jobId);
  const { sections, problem } = useJobSections(jobId);
  const back = { href: `/jobs/${jobId}`, label: job?.name ?? 'Job' } as const;
  const section = sections?.find((one) => one.title === title);
  if (problem && !section) return <ProblemScreen problem={problem} back={back} />;
  if (!section) return <LoadingScreen title={title} back={back} shape="table" />;
  return (
    <SectionBody section={section} back={back} tools={tools}>
      {children}
    </SectionBody>
  );
}

type SectionBodyProps = Pick<SectionScreenProps, 'tools' | 'children'> & {
  section: JobSection;
  back: { href: Href; label: string };
};

function SectionBody({ section, back, tools, children }: SectionBodyProps) {
  const { isSplit } = useLayout();
  const mayEdit = useMay('edit-jobs');
  const { title, items, gap, add, empty } = section;
  const action = mayEdit ? add : undefined;
  if (items.length === 0)
    return (
      <Screen title={title} back={back}>
        <EmptyState title={`No ${title.toLowerCase()} yet`} action={action}>
          {empty}
        </EmptyState>
      </Screen>
    );
  return (
    <Screen title={title} back={back} action={action}>
      {gap ? <Mark verdict="caution" words={gap} size="body" /> : null}
      {tools}
      {isSplit ? children : <ListRows label={title} items={items} flush />}
    </Screen>
  );
}
