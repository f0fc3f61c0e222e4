import { ListPane } from '@/components/ui/list-pane';
import { Loading } from '@/components/ui/loading';
import { useMay } from '@/hooks/use-session';

import { useJobSections } from './use-job-sections';

/** One kind of a job's rows as a list beside the open one. */
export function SectionList({ jobId, title, chosen }: { jobId: string; title: string; chosen?: string }) {
  const { sections } = useJobSections(jobId);
  const mayEdit = useMay('edit-jobs');
  const section = sections?.find((one) => one.title === title);
  if (!section) return <Loading label={title} />;
  return (
    <ListPane
      title={title}
      href={section.href}
      items={section.items}
      chosen={chosen}
      add={mayEdit ? section.add : undefined}
    />
  );
}
