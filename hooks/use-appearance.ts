import { useSyncExternalStore } from 'react';

export const appearances = ['system', 'light', 'night'] as const;
/** `system` follows the device; the others are pinned on this device. */
export type Appearance = (typeof appearances)[number];

const key = 'thickset.appearance';
const listeners = new Set<() => void>();

const isAppearance = (text: string | null): text is Appearance => appearances.some((one) => one === text);

/** A browser that keeps nothing follows the system. */
function stored(): Appearance {
  try {
    const text = window.localStorage.getItem(key);
    return isAppearance(text) ? text : 'system';
  } catch {
    return 'system';
  }
}

function pin(appearance: Appearance): void {
  try {
    if (appearance === 'system') window.localStorage.removeItem(key);
    else window.localStorage.setItem(key, appearance);
  } catch {
    // private windows may refuse; the choice then lasts as long as nothing
  }
  listeners.forEach((changed) => changed());
}

function watch(changed: () => void): () => void {
  listeners.add(changed);
  window.addEventListener('storage', changed);
  return () => {
    listeners.delete(changed);
    window.removeEventListener('storage', changed);
  };
}

/** How this device shows Thickset; other tabs follow. */
export function useAppearance() {
  return { appearance: useSyncExternalStore(watch, stored), pin };
}
