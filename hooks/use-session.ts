import useSWR, { useSWRConfig } from 'swr';
import useSWRMutation from 'swr/mutation';
import { z } from 'zod';

import { mayDo, type Permission } from '@/api/contracts/permission';
import { sessionSchema, type Session, type SignIn } from '@/api/contracts/session';
import { request, RequestFailed, sessionPath } from '@/hooks/request';

const load = (path: string) => request(path, sessionSchema);

/** Who is signed in; `isSignedOut` as soon as the server says that nobody is. */
export function useSession() {
  const { data, error, mutate } = useSWR<Session, RequestFailed>(sessionPath, load);
  const problem = error?.problem;
  return { session: data, problem, isSignedOut: problem?.status === 401, reload: () => void mutate() };
}

/** Whether the person who is signed in may do this; false until it is known. */
export function useMay(permission: Permission): boolean {
  const { session } = useSession();
  return session ? mayDo(session.member, permission) : false;
}

const nothing = z.undefined();
const post = (path: string, { arg }: { arg: SignIn }) => request(path, nothing, { method: 'POST', body: arg });

/** Signing in, also over an open screen: for the same person what is on it stays, for another one nothing does. */
export function useSignIn() {
  const { cache, mutate } = useSWRConfig();
  const { trigger, error, isMutating } = useSWRMutation<undefined, RequestFailed, string, SignIn>(sessionPath, post);
  const signIn = async (input: SignIn): Promise<{ samePerson: boolean }> => {
    const before = sessionSchema.safeParse(cache.get(sessionPath)?.data).data?.member.accountId;
    await trigger(input);
    const session = await load(sessionPath);
    const samePerson = before === session.member.accountId;
    // The answers of whoever was here before, a 401 among them, must not be read again.
    if (!samePerson) await mutate(() => true, undefined, { revalidate: false });
    await mutate(sessionPath, session, { revalidate: false });
    if (samePerson) void mutate((key) => key !== sessionPath);
    return { samePerson };
  };
  return { signIn, problem: error?.problem, busy: isMutating };
}

/** Returns a function that signs out and forgets everything that was read; a session that ended already is as good. */
export function useSignOut() {
  const { mutate } = useSWRConfig();
  return async () => {
    await request(sessionPath, nothing, { method: 'DELETE' }).catch((error: unknown) => {
      if (!(error instanceof RequestFailed) || error.problem.status !== 401) throw error;
    });
    await mutate(() => true, undefined, { revalidate: false });
  };
}
