import { useLocalSearchParams } from 'expo-router';

import { AddendumTable } from '@/components/basis/basis-tables';
import { SectionScreen } from '@/components/job/section-screen';
import { useBasis } from '@/hooks/use-basis';

export default function AddendaScreen() {
  const { job } = useLocalSearchParams<'/jobs/[job]/addenda'>();
  const { addenda = [] } = useBasis(job);
  return (
    <SectionScreen jobId={job} title="Addenda">
      <AddendumTable jobId={job} addenda={addenda} />
    </SectionScreen>
  );
}
