import { useLocalSearchParams } from 'expo-router';

import { DrawingDetail } from '@/components/basis/drawing-detail';
import { NewRowScreen } from '@/components/job/row-screen';

export default function NewDrawingScreen() {
  const { job } = useLocalSearchParams<'/jobs/[job]/drawings/new'>();
  return (
    <NewRowScreen title="New drawing" back={{ href: `/jobs/${job}/drawings`, label: 'Drawings' }}>
      <DrawingDetail jobId={job} drawing={null} />
    </NewRowScreen>
  );
}
