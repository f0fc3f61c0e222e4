import { act, renderHook, waitFor } from '@testing-library/react';

import { useSwitchUnits, useUnits } from '@/hooks/use-units';

import { Client } from '../support/client';
import { fakeApi } from '../support/fake-api';
import { session } from '../support/session';

const inchPound = { ...session, member: { ...session.member, units: 'IP' } };
const useBoth = () => ({ ...useUnits(), switchUnits: useSwitchUnits() });
const start = async () => {
  const { result } = renderHook(useBoth, { wrapper: Client });
  await waitFor(() => expect(result.current.showWithUnit('temperature', 60)).toBe('60.0 °C'));
  return result;
};

it('shows the same value in the units that the person chose, and tells the server', async () => {
  const asked = fakeApi(({ method }) => ({ status: 200, body: method === 'PATCH' ? inchPound : session }));
  const result = await start();
  await act(() => result.current.switchUnits('IP'));
  // 60 °C × 9/5 + 32 = 140 °F
  expect(result.current.showWithUnit('temperature', 60)).toBe('140.0 °F');
  expect(result.current.unitLabel('dimension')).toBe('in');
  expect(asked.at(-1)).toMatchObject({ path: '/api/session', method: 'PATCH', body: { units: 'IP' } });
});

it('goes back when the server could not keep the choice', async () => {
  fakeApi(({ method }) => (method === 'PATCH' ? 'no network' : { status: 200, body: session }));
  const result = await start();
  await act(async () => {
    await expect(result.current.switchUnits('IP')).rejects.toThrow('No connection');
  });
  await waitFor(() => expect(result.current.units).toBe('SI'));
});
