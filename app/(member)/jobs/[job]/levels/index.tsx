import { useLocalSearchParams } from 'expo-router';

import { LevelTable } from '@/components/basis/basis-tables';
import { SectionScreen } from '@/components/job/section-screen';
import { useBasis } from '@/hooks/use-basis';
import { useRuns } from '@/hooks/use-runs';

export default function LevelsScreen() {
  const { job } = useLocalSearchParams<'/jobs/[job]/levels'>();
  const { levels = [] } = useBasis(job);
  const { runs = [] } = useRuns(job);
  const counted = levels.map((level) => ({ level, runs: runs.filter(({ levelId }) => levelId === level.id).length }));
  return (
    <SectionScreen jobId={job} title="Levels">
      <LevelTable jobId={job} levels={counted} />
    </SectionScreen>
  );
}
