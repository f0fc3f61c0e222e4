import { randomUUID } from 'node:crypto';

import type { JobData } from '@/api/contracts/job-data';
import type { Run } from '@/api/contracts/run';
import { judge, judgementOf } from '@/api/services/judging';
import { scheduleOf } from '@/api/services/scheduling';
import { takeoffOf } from '@/api/services/taking-off';
import { demoInMemory } from '@/db/seeds/demo/in-memory';

import { medianTime } from './median';

/** Medians [ms] of judging whole jobs; budgets: the demo 50 ms, the large job 300 ms. */
export async function benchJudging() {
  const demo = await demoInMemory('addendum-1');
  const large = largeJob(demo, { runs: 2000, cases: 60 });
  // a server that has run for a while: the first dozens of studies compile the engine
  for (let times = 0; times < 20; times += 1) judge(demo);
  return {
    demoRuns: demo.runs.length,
    demoJudged: medianTime(31, () => judgementOf(judge(demo))),
    demoScheduleAndTakeoff: medianTime(31, () => [scheduleOf(demo, judge(demo)), takeoffOf(demo, judge(demo))]),
    largeRuns: large.runs.length,
    largeCases: new Set(judge(large).map(({ study }) => study)).size,
    largeJudged: medianTime(15, () => judgementOf(judge(large))),
  };
}

const nominals = ['NPS 1', 'NPS 1-1/2', 'NPS 2', 'NPS 2-1/2', 'NPS 3', 'NPS 4', 'NPS 6', 'NPS 8', 'NPS 10', 'NPS 12'];

/** Runs of the demo's services in the plant room, ten sizes each, over and over with other lengths. */
function largeJob(demo: JobData, { runs, cases }: { runs: number; cases: number }): JobData {
  const model = demo.runs[0]!;
  const plantRoom = demo.places.find(({ name }) => name === 'Plant room')!;
  const made = Array.from({ length: runs }, (_, position): Run => {
    const distinct = position % cases;
    const service = demo.services[Math.floor(distinct / nominals.length)]!;
    return {
      ...model,
      id: randomUUID(),
      number: `L${position}`,
      serviceId: service.id,
      placeId: plantRoom.id,
      shape: {
        kind: 'pipe',
        size: { standard: 'asme-steel', nominal: nominals[distinct % nominals.length]! },
        length: { value: 1 + (position % 97) },
        orientation: 'horizontal',
      },
    };
  });
  return { ...demo, runs: made };
}
