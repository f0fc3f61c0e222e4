import { Slot, useGlobalSearchParams } from 'expo-router';

import { SectionList } from '@/components/job/section-list';
import { useIsOpen } from '@/components/job/use-row-routes';
import { ListBeside } from '@/components/ui/list-beside';

export default function PlacesLayout() {
  const { job, place } = useGlobalSearchParams<{ job: string; place?: string }>();
  return (
    <ListBeside isOpen={useIsOpen('places')} list={<SectionList jobId={job} title="Places" chosen={place} />}>
      <Slot />
    </ListBeside>
  );
}
