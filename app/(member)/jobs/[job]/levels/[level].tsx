import { useLocalSearchParams } from 'expo-router';

import { LevelDetail } from '@/components/basis/level-detail';
import { RowScreen } from '@/components/job/row-screen';
import { useBasis } from '@/hooks/use-basis';

export default function LevelScreen() {
  const { job, level: id } = useLocalSearchParams<'/jobs/[job]/levels/[level]'>();
  const { levels, problem } = useBasis(job);
  return (
    <RowScreen
      noun="level"
      id={id}
      rows={levels}
      problem={problem}
      titleOf={({ name }) => name}
      back={{ href: `/jobs/${job}/levels`, label: 'Levels' }}
    >
      {(level) => <LevelDetail key={id} jobId={job} level={level} />}
    </RowScreen>
  );
}
