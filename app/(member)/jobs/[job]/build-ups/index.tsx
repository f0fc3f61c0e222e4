import { useLocalSearchParams } from 'expo-router';

import { BuildUpTable } from '@/components/build-up/build-up-table';
import { useCoveringNames } from '@/components/build-up/use-covering-names';
import { SectionScreen } from '@/components/job/section-screen';
import { useBuildUps } from '@/hooks/use-build-ups';

export default function BuildUpsScreen() {
  const { job } = useLocalSearchParams<'/jobs/[job]/build-ups'>();
  const { buildUps = [] } = useBuildUps(job);
  const { names } = useCoveringNames(job);
  return (
    <SectionScreen jobId={job} title="Build-ups">
      {names ? <BuildUpTable jobId={job} buildUps={buildUps} names={names} /> : null}
    </SectionScreen>
  );
}
