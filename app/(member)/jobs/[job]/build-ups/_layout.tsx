import { Slot, useGlobalSearchParams } from 'expo-router';

import { SectionList } from '@/components/job/section-list';
import { useIsOpen } from '@/components/job/use-row-routes';
import { ListBeside } from '@/components/ui/list-beside';

export default function BuildUpsLayout() {
  const { job, buildUp } = useGlobalSearchParams<{ job: string; buildUp?: string }>();
  return (
    <ListBeside isOpen={useIsOpen('build-ups')} list={<SectionList jobId={job} title="Build-ups" chosen={buildUp} />}>
      <Slot />
    </ListBeside>
  );
}
