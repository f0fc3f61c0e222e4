import { useEffect, useSyncExternalStore } from 'react';

const unsaved = new Set<symbol>();
const listeners = new Set<() => void>();
const tell = () => listeners.forEach((changed) => changed());

function watch(changed: () => void): () => void {
  listeners.add(changed);
  return () => listeners.delete(changed);
}

/** Whether any form on the page holds what is not saved yet. */
export const useHasUnsaved = (): boolean => useSyncExternalStore(watch, () => unsaved.size > 0);

/** Counts a form as unsaved, and makes the browser ask before the page is closed. */
export function useUnsaved(isUnsaved: boolean): void {
  useEffect(() => {
    if (!isUnsaved) return undefined;
    const form = Symbol('form');
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    unsaved.add(form);
    window.addEventListener('beforeunload', ask);
    tell();
    return () => {
      unsaved.delete(form);
      window.removeEventListener('beforeunload', ask);
      tell();
    };
  }, [isUnsaved]);
}
