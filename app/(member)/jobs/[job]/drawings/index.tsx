import { useLocalSearchParams } from 'expo-router';

import { DrawingTable } from '@/components/basis/basis-tables';
import { SectionScreen } from '@/components/job/section-screen';
import { useBasis } from '@/hooks/use-basis';

export default function DrawingsScreen() {
  const { job } = useLocalSearchParams<'/jobs/[job]/drawings'>();
  const { drawings = [] } = useBasis(job);
  return (
    <SectionScreen jobId={job} title="Drawings">
      <DrawingTable jobId={job} drawings={drawings} />
    </SectionScreen>
  );
}
