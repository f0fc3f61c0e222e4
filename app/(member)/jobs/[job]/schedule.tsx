import { useLocalSearchParams } from 'expo-router';

import { ScheduleList } from '@/components/schedule/schedule-list';
import { TakeoffTables } from '@/components/takeoff/takeoff-tables';
import { EmptyState } from '@/components/ui/empty-state';
import { Heading } from '@/components/ui/heading';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useSchedule, useTakeoff } from '@/hooks/use-schedule';
import { useUnits } from '@/hooks/use-units';

export default function ScheduleScreen() {
  const { job } = useLocalSearchParams<{ job: string }>();
  const { units } = useUnits();
  const { schedule, problem, reload } = useSchedule(job);
  const { takeoff } = useTakeoff(job);
  if (problem && !schedule) return <ProblemScreen problem={problem} onRetry={reload} />;
  if (!schedule) return <LoadingScreen title="Schedule" />;
  if (schedule.rows.length === 0)
    return (
      <Screen title="Schedule">
        <EmptyState
          title="Nothing to schedule yet"
          action={{ label: 'To the runs', href: { pathname: '/jobs/[job]/runs', params: { job } } }}
        >
          The schedule follows from the runs: enter them, and each service, size and place gets its line with what
          decides its thickness.
        </EmptyState>
      </Screen>
    );
  return (
    <Screen title="Schedule" forReading lead="Thickness by service, size and place, each with what decides it.">
      <ScheduleList rows={schedule.rows} units={units} />
      <Heading>Quantities, net</Heading>
      {takeoff ? <TakeoffTables takeoff={takeoff} units={units} /> : null}
    </Screen>
  );
}
