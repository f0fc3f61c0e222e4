import { useLocalSearchParams } from 'expo-router';

import { BuildUpDetail } from '@/components/build-up/build-up-detail';
import { bodyWords, nameIn } from '@/components/build-up/covering-words';
import { RowScreen } from '@/components/job/row-screen';
import { useBuildUps } from '@/hooks/use-build-ups';
import { useServices } from '@/hooks/use-services';

export default function BuildUpScreen() {
  const { job, buildUp: id } = useLocalSearchParams<'/jobs/[job]/build-ups/[buildUp]'>();
  const { buildUps, problem, reload } = useBuildUps(job);
  const { services = [] } = useServices(job);
  return (
    <RowScreen
      noun="build-up"
      id={id}
      rows={buildUps}
      problem={problem}
      onRetry={reload}
      titleOf={({ serviceId }) => nameIn(services, serviceId) || 'Build-up'}
      overOf={({ appliesTo }) => `Build-up · ${bodyWords[appliesTo].toLowerCase()}`}
      back={{ href: `/jobs/${job}/build-ups`, label: 'Build-ups' }}
    >
      {(buildUp) => <BuildUpDetail key={id} jobId={job} buildUp={buildUp} />}
    </RowScreen>
  );
}
