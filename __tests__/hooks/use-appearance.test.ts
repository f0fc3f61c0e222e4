import { act, renderHook } from '@testing-library/react';

import { useAppearance } from '@/hooks/use-appearance';

beforeEach(() => window.localStorage.clear());

it('follows the device until it is pinned, and remembers the pin on this device', () => {
  const { result } = renderHook(useAppearance);
  expect(result.current.appearance).toBe('system');
  act(() => result.current.pin('night'));
  expect(result.current.appearance).toBe('night');
  expect(renderHook(useAppearance).result.current.appearance).toBe('night');
  act(() => result.current.pin('system'));
  expect(result.current.appearance).toBe('system');
});

it('takes what another version stored for nothing', () => {
  window.localStorage.setItem('thickset.appearance', 'sepia');
  expect(renderHook(useAppearance).result.current.appearance).toBe('system');
});
