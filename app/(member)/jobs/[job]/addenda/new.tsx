import { useLocalSearchParams } from 'expo-router';

import { AddendumDetail } from '@/components/basis/addendum-detail';
import { NewRowScreen } from '@/components/job/row-screen';

export default function NewAddendumScreen() {
  const { job } = useLocalSearchParams<'/jobs/[job]/addenda/new'>();
  return (
    <NewRowScreen title="New addendum" back={{ href: `/jobs/${job}/addenda`, label: 'Addenda' }}>
      <AddendumDetail jobId={job} addendum={null} />
    </NewRowScreen>
  );
}
