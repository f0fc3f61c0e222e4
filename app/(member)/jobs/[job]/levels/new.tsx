import { useLocalSearchParams } from 'expo-router';

import { LevelDetail } from '@/components/basis/level-detail';
import { NewRowScreen } from '@/components/job/row-screen';

export default function NewLevelScreen() {
  const { job } = useLocalSearchParams<'/jobs/[job]/levels/new'>();
  return (
    <NewRowScreen title="New level" back={{ href: `/jobs/${job}/levels`, label: 'Levels' }}>
      <LevelDetail jobId={job} level={null} />
    </NewRowScreen>
  );
}
