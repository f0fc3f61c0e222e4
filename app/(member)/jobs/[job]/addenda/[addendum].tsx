import { useLocalSearchParams } from 'expo-router';

import { AddendumDetail } from '@/components/basis/addendum-detail';
import { RowScreen } from '@/components/job/row-screen';
import { useBasis } from '@/hooks/use-basis';

export default function AddendumScreen() {
  const { job, addendum: id } = useLocalSearchParams<'/jobs/[job]/addenda/[addendum]'>();
  const { addenda, problem } = useBasis(job);
  return (
    <RowScreen
      noun="addendum"
      id={id}
      rows={addenda}
      problem={problem}
      titleOf={({ number }) => `Addendum ${number}`}
      back={{ href: `/jobs/${job}/addenda`, label: 'Addenda' }}
    >
      {(addendum) => <AddendumDetail key={id} jobId={job} addendum={addendum} />}
    </RowScreen>
  );
}
