import type { Href } from 'expo-router';

import { Button } from './button';
import { LinkButton } from './link';

/** The one thing to do: go somewhere, or do it here. */
export type Action = { label: string; href: Href } | { label: string; onPress: () => void; busy?: boolean };

export function ActionButton({ action, full }: { action: Action; full?: boolean }) {
  if ('href' in action) return <LinkButton label={action.label} href={action.href} tone="action" full={full} />;
  return <Button label={action.label} onPress={action.onPress} busy={action.busy} tone="action" full={full} />;
}
