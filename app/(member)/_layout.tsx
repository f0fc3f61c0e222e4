import { Redirect, Slot } from 'expo-router';

import { FieldUnitsProvider } from '@/components/forms/field-units';
import { useHasUnsaved } from '@/components/forms/unsaved';
import { SessionEnded } from '@/components/session/session-ended';
import { Shell } from '@/components/shell/shell';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { Main } from '@/components/ui/main';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { useSession } from '@/hooks/use-session';

/** The gate: nobody gets further without a session, and nothing unsaved is lost when one ends. */
export default function MemberLayout() {
  const { session, problem, isSignedOut, reload } = useSession();
  const hasUnsaved = useHasUnsaved();
  if (isSignedOut && !(session && hasUnsaved)) return <ToSignIn />;
  if (!session)
    return (
      <Main>{problem ? <ProblemScreen problem={problem} onRetry={reload} /> : <LoadingScreen title="Thickset" />}</Main>
    );
  return (
    <FieldUnitsProvider units={session.member.units}>
      <Shell session={session}>
        <Slot />
      </Shell>
      {isSignedOut ? <SessionEnded email={session.member.email} /> : null}
    </FieldUnitsProvider>
  );
}

/** And back to where it was asked for, its filters included. */
function ToSignIn() {
  const { pathname, search } = window.location;
  return <Redirect href={{ pathname: '/sign-in', params: { next: `${pathname}${search}` } }} />;
}
