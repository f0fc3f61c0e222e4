import { usePathname } from 'expo-router';
import { useEffect, useRef, useState } from 'react';

import { Hidden } from '@/components/ui/hidden';
import { mainId } from '@/components/ui/main';

/** Says the new page's title, and takes up the keyboard's place when what had it is gone. */
export function Arrival() {
  const pathname = usePathname();
  const [title, setTitle] = useState('');
  const first = useRef(true);
  useEffect(() => {
    const element = document.querySelector('head > title');
    if (!element) return undefined;
    const seen = new MutationObserver(() => setTitle(document.title));
    seen.observe(element, { childList: true, characterData: true, subtree: true });
    return () => seen.disconnect();
  }, []);
  useEffect(() => {
    if (!first.current && document.activeElement === document.body) {
      document.getElementById(mainId)?.focus({ preventScroll: true });
    }
    first.current = false;
  }, [pathname]);
  return (
    <Hidden role="status" aria-live="polite">
      {title}
    </Hidden>
  );
}
