import { useLocalSearchParams } from 'expo-router';

import { NewRowScreen } from '@/components/job/row-screen';
import { SpecificationDetail } from '@/components/specification/specification-detail';
import { Loading } from '@/components/ui/loading';
import { useSpecification } from '@/hooks/use-specification';

export default function NewSpecificationRowScreen() {
  const { job, from } = useLocalSearchParams<'/jobs/[job]/specification/new', { from?: string }>();
  const { specification } = useSpecification(job);
  const copyOf = specification?.find(({ id }) => id === from);
  return (
    <NewRowScreen
      title="New row of the specification"
      back={{ href: `/jobs/${job}/specification`, label: 'Specification' }}
    >
      {from && !specification ? (
        <Loading label="New row of the specification" shape="form" />
      ) : (
        <SpecificationDetail key={from ?? 'new'} jobId={job} row={null} copyOf={copyOf} />
      )}
    </NewRowScreen>
  );
}
