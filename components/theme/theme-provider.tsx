import { useEffect, useSyncExternalStore, type ReactNode } from 'react';

import { light, night } from './tokens';
import { ThemeContext, type Scheme, type Theme } from './use-theme';

/** `system` follows the device; the others are pinned. */
type ThemeProviderProps = { appearance: 'system' | Scheme; children: ReactNode };

const themes: Record<Scheme, Theme> = {
  light: { ...light, scheme: 'light' },
  night: { ...night, scheme: 'night' },
};

export function ThemeProvider({ appearance, children }: ThemeProviderProps) {
  const system = useSyncExternalStore(watchSystem, systemScheme);
  const theme = themes[appearance === 'system' ? system : appearance];
  useEffect(() => paintPage(theme), [theme]);
  return <ThemeContext value={theme}>{children}</ThemeContext>;
}

// A test's document has no media queries.
const darkQuery = () =>
  typeof window.matchMedia === 'function' ? window.matchMedia('(prefers-color-scheme: dark)') : undefined;
const systemScheme = (): Scheme => (darkQuery()?.matches ? 'night' : 'light');

function watchSystem(changed: () => void): () => void {
  const query = darkQuery();
  query?.addEventListener('change', changed);
  return () => query?.removeEventListener('change', changed);
}

/** What React does not draw: the page behind, the browser's own parts, the focus ring. */
function paintPage({ scheme, ...colours }: Theme): void {
  const page = document.documentElement;
  page.style.colorScheme = scheme === 'night' ? 'dark' : 'light';
  for (const [name, colour] of Object.entries(colours)) page.style.setProperty(`--${name}`, colour);
  document.querySelectorAll('meta[name="theme-color"]').forEach((meta) => meta.setAttribute('content', colours.paper));
}
