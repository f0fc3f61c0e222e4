import { BackLink } from '@/components/ui/back-link';
import { Link } from '@/components/ui/link';
import { Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import type { RunRow } from '@/components/run/run-row';
import { useLayout } from '@/components/theme/use-layout';
import { useMay } from '@/hooks/use-session';
import { useUnits } from '@/hooks/use-units';

import { NeighbourLinks } from './neighbour-links';
import type { Neighbours } from './neighbours';
import { runOver, runTitle } from './run-words';

/** What stands over a run's study: on a phone the way back and on share one line. */
export function useRunHead({ jobId, row, neighbours }: { jobId: string; row: RunRow; neighbours: Neighbours }) {
  const { units } = useUnits();
  const { isPhone } = useLayout();
  const mayEdit = useMay('edit-jobs');
  const back = { href: { pathname: '/jobs/[job]/runs', params: { job: jobId } }, label: 'Runs' } as const;
  const edit = { pathname: '/jobs/[job]/runs/[run]/edit', params: { job: jobId, run: row.run.id } } as const;
  const title = runTitle(row, units);
  const over = runOver(row, units);
  const links = <NeighbourLinks jobId={jobId} neighbours={neighbours} />;
  const editLink = mayEdit ? <Link href={edit} label="Edit the run" /> : null;
  const shared = { title, tabTitle: `${row.run.number} ${title}` };
  if (!isPhone)
    return {
      ...shared,
      back,
      over,
      aside: (
        <Row gap="lg">
          {editLink}
          {links}
        </Row>
      ),
    };
  const lines = (
    <Stack gap="xxs">
      <Row spread>
        <BackLink {...back} />
        {links}
      </Row>
      <Text tone="inkSoft">{over}</Text>
    </Stack>
  );
  return { ...shared, over: lines };
}
