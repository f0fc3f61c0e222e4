import type { Href } from 'expo-router';
import type { ReactNode } from 'react';

import type { Problem } from '@/api/contracts/problem';
import { useLayout } from '@/components/theme/use-layout';
import { EmptyState } from '@/components/ui/empty-state';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { Notice } from '@/components/ui/notice';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useMay } from '@/hooks/use-session';

type Back = { href: Href; label: string };
type Stored = { id: string };

type RowScreenProps<Row extends Stored> = {
  /** "place", "service": what is not there when it is not there */
  noun: string;
  id: string;
  rows: readonly Row[] | undefined;
  problem: Problem | undefined;
  onRetry?: () => void;
  titleOf: (row: Row) => string;
  /** above the title */
  overOf?: (row: Row) => string;
  back: Back;
  /** no list stands beside it, however wide the screen */
  isAlone?: boolean;
  children: (row: Row) => ReactNode;
};

/** One row of a list: it may be on its way, or deleted by someone else meanwhile. */
export function RowScreen<Row extends Stored>(props: RowScreenProps<Row>) {
  const { noun, id, rows, problem, onRetry, titleOf, overOf, isAlone, children } = props;
  const beside = useBack(props.back);
  const back = isAlone ? props.back : beside;
  if (problem && !rows) return <ProblemScreen problem={problem} onRetry={onRetry} back={back} />;
  if (!rows) return <LoadingScreen title={props.back.label} back={back} shape="form" />;
  const row = rows.find((one) => one.id === id);
  if (!row) return <Gone noun={noun} back={props.back} />;
  return (
    <Screen title={titleOf(row)} over={overOf?.(row)} back={back}>
      {children(row)}
    </Screen>
  );
}

function Gone({ noun, back }: { noun: string; back: Back }) {
  return (
    <Screen title={`This ${noun} is not there`} back={back}>
      <EmptyState title="Perhaps it was deleted" action={{ label: `To ${back.label.toLowerCase()}`, href: back.href }}>
        {`The address leads to a ${noun} that is not there any more.`}
      </EmptyState>
    </Screen>
  );
}

/** A new row: only for who may edit. */
export function NewRowScreen({ title, back, children }: { title: string; back: Back; children: ReactNode }) {
  const mayEdit = useMay('edit-jobs');
  return (
    <Screen title={title} back={useBack(back)}>
      {mayEdit ? children : <Notice title="For reading only">An estimator of your firm changes jobs.</Notice>}
    </Screen>
  );
}

/** Beside its list, a row needs no way back to it. */
function useBack(back: Back): Back | undefined {
  const { isSplit } = useLayout();
  return isSplit ? undefined : back;
}
