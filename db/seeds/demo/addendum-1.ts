import type { SpecificationRow } from '@/api/contracts/build-up';

import { demoAddendum, demoDays, demoZone } from './basis';
import { dayFrom } from './days';
import { enterRuns, jobInput, scoped, type Entered, type Entering } from './enter-job';
import { demoAddedRuns } from './level-3-runs';
import { demoAddedRows, demoChangedRows } from './specification';

/** Addendum 1 as it came three days ago: the roof painted white, R34 with its row, the bid two days later. */
export async function enterAddendum(entering: Entering, entered: Entered): Promise<void> {
  const { services, member, today } = entering;
  const { job, ids } = entered;
  const date = dayFrom(today, { zone: demoZone, days: demoDays.addendum });
  await services.basis.addenda.create(member, job.id, { ...demoAddendum, date });
  await services.job.change(member, job, jobInput(entering, ids.contacts, demoDays.bid));
  for (const row of entered.specification) await changeRow(entering, job.id, row);
  for (const row of demoAddedRows) await services.specification.create(member, job.id, scoped(row, ids));
  await enterRuns(entering, entered, demoAddedRuns);
}

async function changeRow({ services, member }: Entering, job: string, row: SpecificationRow): Promise<void> {
  const change = demoChangedRows[row.label];
  if (change) await services.specification.change(member, { job, id: row.id }, { ...row, ...change });
}
