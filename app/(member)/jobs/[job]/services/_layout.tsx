import { Slot, useGlobalSearchParams } from 'expo-router';

import { SectionList } from '@/components/job/section-list';
import { useIsOpen } from '@/components/job/use-row-routes';
import { ListBeside } from '@/components/ui/list-beside';

export default function ServicesLayout() {
  const { job, service } = useGlobalSearchParams<{ job: string; service?: string }>();
  return (
    <ListBeside isOpen={useIsOpen('services')} list={<SectionList jobId={job} title="Services" chosen={service} />}>
      <Slot />
    </ListBeside>
  );
}
