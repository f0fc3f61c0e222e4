import { useEffect, useState } from 'react';

import { ConfirmDialog } from '@/components/ui/confirm-dialog';

import { useUnsaved } from './unsaved';

/** What was held back, to be done after all: at once, or with a promise that settles when it is done. */
type Leaving = () => Promise<unknown> | undefined;

/** Asks before a link or the back button throws away what is not saved. */
export function LeaveGuard({ isUnsaved }: { isUnsaved: boolean }) {
  const [leave, setLeave] = useState<Leaving>();
  const [isGoing, setGoing] = useState(false);
  const asks = isUnsaved && leave === undefined && !isGoing;
  useUnsaved(isUnsaved);
  useEffect(() => (asks ? holdLeaving((go) => setLeave(() => go)) : undefined), [asks]);
  if (!leave) return null;
  return (
    <DiscardDialog
      onKeep={() => setLeave(undefined)}
      onDiscard={() => {
        const gone = leave();
        setLeave(undefined);
        // going back takes a moment, in which nothing may ask again
        setGoing(gone !== undefined);
        void gone?.finally(() => setGoing(false));
      }}
    />
  );
}

export function DiscardDialog({ onKeep, onDiscard }: { onKeep: () => void; onDiscard: () => void }) {
  return (
    <ConfirmDialog
      title="Leave without saving?"
      confirm="Leave without saving"
      cancel="Stay"
      onConfirm={onDiscard}
      onCancel={onKeep}
    >
      What you changed here is not saved yet, and would be lost.
    </ConfirmDialog>
  );
}

/** Stops a link and the browser's back and forward; `ask` gets what would have happened. */
function holdLeaving(ask: (go: Leaving) => void): () => void {
  const stopClick = (event: MouseEvent) => {
    const link = event.target instanceof Element ? event.target.closest<HTMLAnchorElement>('a[href]') : null;
    if (!link || !opensHere(link, event)) return;
    event.preventDefault();
    event.stopPropagation();
    ask(() => {
      link.click();
      return undefined;
    });
  };
  const stopBack = (event: NavigateEvent) => {
    if (event.navigationType !== 'traverse' || !event.cancelable) return;
    event.preventDefault();
    const { key } = event.destination;
    ask(() => window.navigation.traverseTo(key).finished?.catch(() => undefined));
  };
  // before React sees the click; not every browser has `navigation`, nor does a test's
  const history = 'navigation' in window ? window.navigation : undefined;
  document.addEventListener('click', stopClick, true);
  history?.addEventListener('navigate', stopBack);
  return () => {
    document.removeEventListener('click', stopClick, true);
    history?.removeEventListener('navigate', stopBack);
  };
}

function opensHere(link: HTMLAnchorElement, event: MouseEvent): boolean {
  const elsewhere = link.target !== '' && link.target !== '_self';
  const modified = [event.metaKey, event.ctrlKey, event.shiftKey, event.altKey].includes(true) || event.button !== 0;
  const inPage = link.getAttribute('href')?.startsWith('#') ?? false;
  return !elsewhere && !modified && !inPage && !link.hasAttribute('download');
}
