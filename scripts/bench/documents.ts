import { performance } from 'node:perf_hooks';

import { renderTakeoff } from '@/api/documents/takeoff-pdf';
import { takeSnapshot } from '@/api/services/snapshot';
import { demoInMemory } from '@/db/seeds/demo/in-memory';
import { demoEstimator, demoFirm } from '@/db/seeds/demo/people';

import { medianTime } from './median';

/** Medians [ms] of freezing the demo and of its PDF, first and later ones; budget: the PDF 1000 ms. */
export async function benchDocuments() {
  const data = await demoInMemory('addendum-1');
  const firm = { ...demoFirm, id: data.job.id };
  const issue = { letter: 'B', frozenAt: new Date('2026-03-12T15:40:00Z'), validUntil: '2026-04-26' };
  const freeze = () => takeSnapshot({ data, firm, member: demoEstimator, issue });
  const snapshot = freeze();
  const taken: number[] = [];
  let bytes = 0;
  for (let times = 0; times < 7; times += 1) {
    const start = performance.now();
    bytes = (await renderTakeoff(snapshot, { draft: false })).length;
    taken.push(performance.now() - start);
  }
  return {
    demoSnapshot: medianTime(7, freeze),
    demoPdfFirst: taken[0] ?? NaN,
    demoPdf: taken.toSorted((one, other) => one - other)[3] ?? NaN,
    demoPdfBytes: bytes,
  };
}
