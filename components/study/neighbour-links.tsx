import { Link } from '@/components/ui/link';
import { Row } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import type { Neighbours } from './neighbours';

type NeighbourLinksProps = { jobId: string; neighbours: Neighbours };

/** On to the next run without the way over the list. */
export function NeighbourLinks({ jobId, neighbours }: NeighbourLinksProps) {
  const { before, after, words } = neighbours;
  const to = (run: string) => ({ pathname: '/jobs/[job]/runs/[run]', params: { job: jobId, run } }) as const;
  return (
    <Row gap="md" role="navigation" aria-label="Runs before and after" wrap={false}>
      {before ? <Link href={to(before.id)} label={`‹ ${before.number}`} /> : null}
      <Text tone="inkSoft" numeric noWrap>
        {words}
      </Text>
      {after ? <Link href={to(after.id)} label={`${after.number} ›`} /> : null}
    </Row>
  );
}
