import { act, render, screen } from '@testing-library/react';

import { ThemeProvider } from '@/components/theme/theme-provider';
import { useTheme } from '@/components/theme/use-theme';

const Scheme = () => <p>{useTheme().scheme}</p>;

/** A device whose setting can be changed while the page is open. */
function device(dark: boolean) {
  const listeners = new Set<() => void>();
  const query = {
    matches: dark,
    addEventListener: (_: string, changed: () => void) => listeners.add(changed),
    removeEventListener: (_: string, changed: () => void) => listeners.delete(changed),
  };
  Object.defineProperty(window, 'matchMedia', { value: () => query, configurable: true });
  return (next: boolean) => {
    query.matches = next;
    listeners.forEach((changed) => changed());
  };
}

afterEach(() => Reflect.deleteProperty(window, 'matchMedia'));

it('follows the device, also when it changes', () => {
  const turn = device(false);
  render(
    <ThemeProvider appearance="system">
      <Scheme />
    </ThemeProvider>,
  );
  expect(screen.getByText('light')).toBeTruthy();
  act(() => turn(true));
  expect(screen.getByText('night')).toBeTruthy();
  expect(document.documentElement.style.colorScheme).toBe('dark');
  expect(document.documentElement.style.getPropertyValue('--paper')).toBe('#11161B');
});

it('stays as pinned whatever the device says', () => {
  device(true);
  render(
    <ThemeProvider appearance="light">
      <Scheme />
    </ThemeProvider>,
  );
  expect(screen.getByText('light')).toBeTruthy();
});
