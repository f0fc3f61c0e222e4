import { useGlobalSearchParams, usePathname } from 'expo-router';
import { useEffect, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Session } from '@/api/contracts/session';
import { fetchDrawings } from '@/components/drawing/drawn';
import { useLayout } from '@/components/theme/use-layout';
import { Main } from '@/components/ui/main';
import { useJob } from '@/hooks/use-job';
import { useJudgement } from '@/hooks/use-judgement';

import { Arrival } from './arrival';
import { BottomBar } from './bottom-bar';
import { generalPlaces, isDetail, jobPlaces } from './places';
import { Rail, type ShellPlaces } from './rail';

type ShellProps = { session: Session; children: ReactNode };

/** What stands around every screen of a member. */
export function Shell(props: ShellProps) {
  useEffect(fetchDrawings, []);
  const { job } = useGlobalSearchParams();
  return typeof job === 'string' ? <JobShell job={job} {...props} /> : <PlainShell {...props} />;
}

function JobShell({ job, ...props }: ShellProps & { job: string }) {
  const pathname = usePathname();
  const name = useJob(job).job?.name;
  const flags = useJudgement(job).judgement?.runs.reduce((sum, run) => sum + run.flags.length, 0);
  const places = {
    jobName: name,
    inJob: jobPlaces({ job, pathname, flags }),
    general: generalPlaces({ pathname, inJob: true }),
  };
  return <Frame {...props} places={places} />;
}

function PlainShell(props: ShellProps) {
  const pathname = usePathname();
  return <Frame {...props} places={{ inJob: [], general: generalPlaces({ pathname, inJob: false }) }} />;
}

function Frame({ session, children, places }: ShellProps & { places: ShellPlaces }) {
  const { isPhone } = useLayout();
  const pathname = usePathname();
  return (
    <View style={[styles.frame, isPhone ? styles.column : styles.row]}>
      {isPhone ? null : <Rail {...places} session={session} />}
      <Main>{children}</Main>
      {isPhone && !isDetail(pathname) ? <BottomBar {...places} session={session} /> : null}
      <Arrival />
    </View>
  );
}

const styles = StyleSheet.create({
  frame: { flex: 1, minHeight: 0 },
  row: { flexDirection: 'row' },
  column: { flexDirection: 'column' },
});
