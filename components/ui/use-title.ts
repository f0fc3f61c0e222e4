import { useEffect } from 'react';

/** What the tab, the history and a bookmark call this page. */
export function useTitle(title: string): void {
  useEffect(() => {
    document.title = title === 'Thickset' ? title : `${title} · Thickset`;
  }, [title]);
}
