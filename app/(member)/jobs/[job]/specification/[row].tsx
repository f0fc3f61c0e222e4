import { useLocalSearchParams } from 'expo-router';

import { nameIn } from '@/components/build-up/covering-words';
import { RowScreen } from '@/components/job/row-screen';
import { SpecificationDetail } from '@/components/specification/specification-detail';
import { useServices } from '@/hooks/use-services';
import { useSpecification } from '@/hooks/use-specification';

export default function SpecificationRowScreen() {
  const { job, row: id } = useLocalSearchParams<'/jobs/[job]/specification/[row]'>();
  const { specification, problem, reload } = useSpecification(job);
  const { services = [] } = useServices(job);
  return (
    <RowScreen
      noun="row"
      id={id}
      rows={specification}
      problem={problem}
      onRetry={reload}
      titleOf={({ label, serviceId }) => `${label}, ${nameIn(services, serviceId)}`}
      overOf={() => 'Specification'}
      back={{ href: `/jobs/${job}/specification`, label: 'Specification' }}
    >
      {(row) => <SpecificationDetail key={id} jobId={job} row={row} />}
    </RowScreen>
  );
}
