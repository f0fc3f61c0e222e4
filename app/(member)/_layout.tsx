import { Navigator, Redirect, Slot, useRouter } from 'expo-router';
import { useEffect, useState } from 'react';

import { FieldUnitsProvider } from '@/components/forms/field-units';
import { useHasUnsaved } from '@/components/forms/unsaved';
import { SessionEnded } from '@/components/session/session-ended';
import { Shell } from '@/components/shell/shell';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { Main } from '@/components/ui/main';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { useSession } from '@/hooks/use-session';

/** The navigator stands before it is known who is there: without it the router forgets which screen was asked for. */
export default function MemberLayout() {
  return (
    <Navigator>
      <Gate />
    </Navigator>
  );
}

/** Nobody gets further without a session, and nothing unsaved is lost when one ends. */
function Gate() {
  const { session, problem, isSignedOut, reload } = useSession();
  const hasUnsaved = useHasUnsaved();
  // as long as no screen is drawn, the router does not keep the address in full
  const [arrival] = useState(address);
  if (isSignedOut && !(session && hasUnsaved)) return <ToSignIn next={session ? address() : arrival} />;
  if (!session && problem) {
    return (
      <Main>
        <ProblemScreen problem={problem} onRetry={reload} />
      </Main>
    );
  }
  if (!session) {
    return (
      <Main>
        <LoadingScreen title="Thickset" />
      </Main>
    );
  }
  return (
    <FieldUnitsProvider units={session.member.units}>
      <Shell session={session}>
        <Slot />
      </Shell>
      <FullAddress />
      {isSignedOut ? <SessionEnded email={session.member.email} /> : null}
    </FieldUnitsProvider>
  );
}

/** Brings back the part of the address that the router dropped while no screen was drawn: a change of nothing makes it look again. */
function FullAddress() {
  const router = useRouter();
  useEffect(() => router.setParams({}), [router]);
  return null;
}

const address = () => `${window.location.pathname}${window.location.search}`;

/** And back to where it was asked for, its filters included. */
const ToSignIn = ({ next }: { next: string }) => <Redirect href={{ pathname: '/sign-in', params: { next } }} />;
