import { Slot, useGlobalSearchParams } from 'expo-router';

import { SectionList } from '@/components/job/section-list';
import { useIsOpen } from '@/components/job/use-row-routes';
import { ListBeside } from '@/components/ui/list-beside';

export default function DrawingsLayout() {
  const { job, drawing } = useGlobalSearchParams<{ job: string; drawing?: string }>();
  return (
    <ListBeside isOpen={useIsOpen('drawings')} list={<SectionList jobId={job} title="Drawings" chosen={drawing} />}>
      <Slot />
    </ListBeside>
  );
}
