import { Slot, useGlobalSearchParams } from 'expo-router';

import { SectionList } from '@/components/job/section-list';
import { useIsOpen } from '@/components/job/use-row-routes';
import { ListBeside } from '@/components/ui/list-beside';

export default function SpecificationLayout() {
  const { job, row } = useGlobalSearchParams<{ job: string; row?: string }>();
  return (
    <ListBeside
      isOpen={useIsOpen('specification')}
      list={<SectionList jobId={job} title="Specification" chosen={row} />}
    >
      <Slot />
    </ListBeside>
  );
}
