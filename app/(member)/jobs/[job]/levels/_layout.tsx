import { Slot, useGlobalSearchParams } from 'expo-router';

import { SectionList } from '@/components/job/section-list';
import { useIsOpen } from '@/components/job/use-row-routes';
import { ListBeside } from '@/components/ui/list-beside';

export default function LevelsLayout() {
  const { job, level } = useGlobalSearchParams<{ job: string; level?: string }>();
  return (
    <ListBeside isOpen={useIsOpen('levels')} list={<SectionList jobId={job} title="Levels" chosen={level} />}>
      <Slot />
    </ListBeside>
  );
}
