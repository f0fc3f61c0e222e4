import { act, renderHook, waitFor } from '@testing-library/react';
import useSWR from 'swr';
import { z } from 'zod';

import { request } from '@/hooks/request';
import { useMay, useSession, useSignIn, useSignOut } from '@/hooks/use-session';

import { Client } from '../support/client';
import { fakeApi, type FakeAnswer } from '../support/fake-api';
import { session } from '../support/session';

const signedOut: FakeAnswer = {
  status: 401,
  body: { type: '/problems/sign-in', title: 'Sign in first', status: 401 },
};
const credentials = { email: 'ines@brackwater.example', password: 'thirteen runs' };

/** A server with one session, in or out, and a list of jobs that only a member sees. */
function server(state: { signedIn: boolean; who?: typeof session }) {
  return fakeApi(({ path, method }) => {
    if (method === 'POST') state.signedIn = true;
    if (method === 'DELETE') state.signedIn = false;
    if (method === 'POST' || method === 'DELETE') return { status: 204 };
    if (!state.signedIn) return signedOut;
    return path === '/api/session' ? { status: 200, body: state.who ?? session } : { status: 200, body: ['R29'] };
  });
}

const useAll = () => {
  const jobs = useSWR('/jobs', (path: string) => request(path, z.array(z.string())));
  return { ...useSession(), ...useSignIn(), signOut: useSignOut(), maySend: useMay('send'), jobs };
};
const start = () => renderHook(useAll, { wrapper: Client });

it('knows who is signed in and what they may do', async () => {
  server({ signedIn: true });
  const { result } = start();
  expect(result.current.maySend).toBe(false);
  await waitFor(() => expect(result.current.session?.member.name).toBe('Ines Varga'));
  expect(result.current.maySend).toBe(true);
  expect(result.current.isSignedOut).toBe(false);
});

it('reads everything anew after signing in, the refusals of before included', async () => {
  server({ signedIn: false });
  const { result } = start();
  await waitFor(() => expect(result.current.isSignedOut).toBe(true));
  await act(() => result.current.signIn(credentials));
  await waitFor(() => expect(result.current.session?.firm.name).toBe('Brackwater Lagging'));
  expect(result.current.isSignedOut).toBe(false);
});

it('forgets what another person had read', async () => {
  const state = { signedIn: true, who: session };
  server(state);
  const { result } = start();
  await waitFor(() => expect(result.current.jobs.data).toEqual(['R29']));
  state.who = { ...session, member: { ...session.member, accountId: '7d5b3c1e-0a58-4d2f-9c5e-1f6f2a3b4c09' } };
  let samePerson: boolean | undefined;
  await act(async () => ({ samePerson } = await result.current.signIn(credentials)));
  expect(samePerson).toBe(false);
  expect(result.current.jobs.data).toBeUndefined();
});

it('keeps what is on the screen when the same person signs in again', async () => {
  server({ signedIn: true });
  const { result } = start();
  await waitFor(() => expect(result.current.jobs.data).toEqual(['R29']));
  let samePerson: boolean | undefined;
  await act(async () => ({ samePerson } = await result.current.signIn(credentials)));
  expect(samePerson).toBe(true);
  expect(result.current.jobs.data).toEqual(['R29']);
});

it('says what the server says of a wrong password', async () => {
  fakeApi(() => ({
    status: 401,
    body: { type: '/problems/wrong-password', title: 'E-mail and password do not match', status: 401 },
  }));
  const { result } = start();
  await act(() => expect(result.current.signIn(credentials)).rejects.toThrow('E-mail and password do not match'));
});

it('signs out and forgets, also when the session had ended by itself', async () => {
  const state = { signedIn: true };
  server(state);
  const { result } = start();
  await waitFor(() => expect(result.current.session).toBeDefined());
  fakeApi(() => signedOut);
  await act(() => result.current.signOut());
  expect(result.current.session).toBeUndefined();
});

it.each([
  ['/jobs', 'GET'],
  ['/session', 'PATCH'],
] as const)('notices by a refused %s that the session has ended', async (path, method) => {
  const state = { signedIn: true };
  server(state);
  // the app's own memory, which `request` knows
  const { result } = renderHook(useSession);
  await waitFor(() => expect(result.current.session).toBeDefined());
  state.signedIn = false;
  await act(() => expect(request(path, z.unknown(), { method })).rejects.toThrow('Sign in first'));
  await waitFor(() => expect(result.current.isSignedOut).toBe(true));
  expect(result.current.session?.member.name).toBe('Ines Varga');
});
