import { Slot, useGlobalSearchParams } from 'expo-router';

import { SectionList } from '@/components/job/section-list';
import { useIsOpen } from '@/components/job/use-row-routes';
import { ListBeside } from '@/components/ui/list-beside';

export default function AddendaLayout() {
  const { job, addendum } = useGlobalSearchParams<{ job: string; addendum?: string }>();
  return (
    <ListBeside isOpen={useIsOpen('addenda')} list={<SectionList jobId={job} title="Addenda" chosen={addendum} />}>
      <Slot />
    </ListBeside>
  );
}
