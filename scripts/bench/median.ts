import { performance } from 'node:perf_hooks';

/** Median time of a piece of work [ms], after one run that is not counted. */
export function medianTime(times: number, work: () => unknown): number {
  work();
  const taken = Array.from({ length: times }, () => {
    const start = performance.now();
    work();
    return performance.now() - start;
  }).toSorted((one, other) => one - other);
  return taken[Math.floor(times / 2)] ?? NaN;
}
