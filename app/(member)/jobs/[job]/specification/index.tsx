import { useLocalSearchParams } from 'expo-router';

import { useCoveringNames } from '@/components/build-up/use-covering-names';
import { SectionScreen } from '@/components/job/section-screen';
import { SpecificationTable } from '@/components/specification/specification-table';
import { useSpecification } from '@/hooks/use-specification';

export default function SpecificationScreen() {
  const { job } = useLocalSearchParams<'/jobs/[job]/specification'>();
  const { specification = [] } = useSpecification(job);
  const { names } = useCoveringNames(job);
  return (
    <SectionScreen jobId={job} title="Specification">
      {names ? <SpecificationTable jobId={job} rows={specification} names={names} /> : null}
    </SectionScreen>
  );
}
