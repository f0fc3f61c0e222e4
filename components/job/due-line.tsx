import type { Moment } from '@/api/contracts/job';
import { Text, Words } from '@/components/ui/text';
import { useNow } from '@/hooks/use-now';

import { countdown, dueShort, instantOf } from './due-words';

const tones = { past: 'inkSoft', today: 'fail', ahead: 'inkSoft' } as const;

/** When a bid is due on the client's clock, and how long that is from now. */
export function DueLine({ due }: { due: Moment | null }) {
  const now = useNow();
  if (!due) return <Text tone="inkSoft">no date</Text>;
  const { text, standing } = countdown(instantOf(due), now);
  return (
    <Text>
      {`${dueShort(due)} `}
      <Words tone={tones[standing]} weight={standing === 'today' ? 'strong' : 'regular'} noWrap>
        {text}
      </Words>
    </Text>
  );
}
