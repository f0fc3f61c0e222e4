import type { Problem } from '@/api/contracts/problem';
import type { RunRow } from '@/components/run/run-row';
import { EmptyState } from '@/components/ui/empty-state';
import { Heading } from '@/components/ui/heading';
import { Link, LinkButton } from '@/components/ui/link';
import { ProblemWords } from '@/components/ui/problem-words';
import { Screen } from '@/components/ui/screen';
import { Row } from '@/components/ui/stack';
import { useMay } from '@/hooks/use-session';

import type { Neighbours } from './neighbours';
import { useRunHead } from './use-run-head';

type NoStudyScreenProps = { jobId: string; row: RunRow; problem: Problem; neighbours: Neighbours; onRetry: () => void };

/** A run without a study: what is missing or wrong, and the way to put it right. */
export function NoStudyScreen({ jobId, row, problem, neighbours, onRetry }: NoStudyScreenProps) {
  const head = useRunHead({ jobId, row, neighbours });
  return (
    <Screen {...head}>
      {row.judged?.flags.some(({ kind }) => kind === 'not-specified') ? (
        <NothingSays jobId={jobId} service={row.service?.name ?? 'this service'} />
      ) : (
        <CannotBe {...{ jobId, row, problem, onRetry }} />
      )}
    </Screen>
  );
}

function NothingSays({ jobId, service }: { jobId: string; service: string }) {
  const mayEdit = useMay('edit-jobs');
  const make = { label: 'Make a build-up', href: `/jobs/${jobId}/build-ups/new` as const };
  return (
    <>
      <EmptyState title="Nothing says yet how to insulate this run" action={mayEdit ? make : undefined}>
        {`No row of the specification and no build-up fits ${service} here in this size. A build-up names the layers and the finish; the study then finds the thickness.`}
      </EmptyState>
      {mayEdit ? <Link href={`/jobs/${jobId}/specification/new`} label="Or enter a row of the specification" /> : null}
    </>
  );
}

function CannotBe({ jobId, row, problem, onRetry }: Omit<NoStudyScreenProps, 'neighbours'>) {
  const mayEdit = useMay('edit-jobs');
  const { run, place, service } = row;
  return (
    <>
      <Heading>{problem.title}</Heading>
      <ProblemWords problem={problem} onRetry={onRetry} />
      {mayEdit && problem.status === 422 ? (
        <Row>
          <LinkButton label="Edit the run" href={`/jobs/${jobId}/runs/${run.id}/edit`} />
          {place ? <LinkButton label={`Open ${place.name}`} href={`/jobs/${jobId}/places/${place.id}`} /> : null}
          {service ? (
            <LinkButton label={`Open ${service.name}`} href={`/jobs/${jobId}/services/${service.id}`} />
          ) : null}
        </Row>
      ) : null}
    </>
  );
}
