import type { RunRow } from '@/components/run/run-row';

type Neighbour = { id: string; number: string };
export type Neighbours = { before: Neighbour | null; after: Neighbour | null; words: string };

/** The runs before and after one in the job's own order, and where it stands: "30 of 42". */
export function neighboursOf(rows: readonly RunRow[], runId: string): Neighbours {
  const at = rows.findIndex(({ run }) => run.id === runId);
  const neighbour = (place: number): Neighbour | null => {
    const run = rows[place]?.run;
    return at >= 0 && run ? { id: run.id, number: run.number } : null;
  };
  return { before: neighbour(at - 1), after: neighbour(at + 1), words: `${at + 1} of ${rows.length}` };
}
