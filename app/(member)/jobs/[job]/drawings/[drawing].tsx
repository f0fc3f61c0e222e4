import { useLocalSearchParams } from 'expo-router';

import { DrawingDetail } from '@/components/basis/drawing-detail';
import { RowScreen } from '@/components/job/row-screen';
import { useBasis } from '@/hooks/use-basis';

export default function DrawingScreen() {
  const { job, drawing: id } = useLocalSearchParams<'/jobs/[job]/drawings/[drawing]'>();
  const { drawings, problem } = useBasis(job);
  return (
    <RowScreen
      noun="drawing"
      id={id}
      rows={drawings}
      problem={problem}
      titleOf={({ number }) => number}
      overOf={({ title }) => title}
      back={{ href: `/jobs/${job}/drawings`, label: 'Drawings' }}
    >
      {(drawing) => <DrawingDetail key={id} jobId={job} drawing={drawing} />}
    </RowScreen>
  );
}
