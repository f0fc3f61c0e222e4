import { useSyncExternalStore } from 'react';

import { breakpoint } from './tokens';

/** phone: one column and a bottom bar; wide: a rail; split: room for a list beside its detail. */
export type Layout = 'phone' | 'wide' | 'split';

export const layoutOf = (width: number): Layout =>
  width >= breakpoint.split ? 'split' : width >= breakpoint.wide ? 'wide' : 'phone';

// The page's own width, which a wide table does not stretch as it does the window's.
const pageWidth = () => document.documentElement.clientWidth || window.innerWidth;

function watchSize(changed: () => void): () => void {
  window.addEventListener('resize', changed);
  return () => window.removeEventListener('resize', changed);
}

export type LayoutFlags = { layout: Layout; isPhone: boolean; isSplit: boolean };

/** The one place that asks how wide the screen is; it renders again only when the layout changes. */
export function useLayout(): LayoutFlags {
  const layout = useSyncExternalStore(watchSize, () => layoutOf(pageWidth()));
  return { layout, isPhone: layout === 'phone', isSplit: layout === 'split' };
}
