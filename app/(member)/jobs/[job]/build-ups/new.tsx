import { useLocalSearchParams } from 'expo-router';

import { NewRowScreen } from '@/components/job/row-screen';
import { BuildUpDetail } from '@/components/build-up/build-up-detail';
import { Loading } from '@/components/ui/loading';
import { useBuildUps } from '@/hooks/use-build-ups';

export default function NewBuildUpScreen() {
  const { job, from } = useLocalSearchParams<'/jobs/[job]/build-ups/new', { from?: string }>();
  const { buildUps } = useBuildUps(job);
  const copyOf = buildUps?.find(({ id }) => id === from);
  return (
    <NewRowScreen title="New build-up" back={{ href: `/jobs/${job}/build-ups`, label: 'Build-ups' }}>
      {from && !buildUps ? (
        <Loading label="New build-up" shape="form" />
      ) : (
        <BuildUpDetail key={from ?? 'new'} jobId={job} buildUp={null} copyOf={copyOf} />
      )}
    </NewRowScreen>
  );
}
