import type { FirmInput, Member, MemberInput } from '@/api/contracts/session';

import { enterAddendum } from './demo/addendum-1';
import { demoDays, demoJob, demoTimes, demoZone } from './demo/basis';
import { dayFrom, momentOf } from './demo/days';
import { enterJob } from './demo/enter-job';
import { demoEstimator, demoFirm, demoOwner, demoPeople } from './demo/people';
import { sendRevisionA } from './demo/revision-a';
import type { ServicesAt } from './demo/services-of-a-seed';

type Owner = Pick<MemberInput, 'name' | 'email' | 'password'>;
export type DemoParts = {
  /** the firm's owner when an earlier seed got that far */
  owner: Member | undefined;
  member: {
    foundFirm(firm: FirmInput, owner: Owner): Promise<Member>;
    addMember(owner: Member, person: MemberInput): Promise<Member>;
    list(member: Member): Promise<Member[]>;
  };
  /** one transaction for all that is done with these services: a job is seeded whole or not at all */
  together: (firmId: string, work: (servicesAt: ServicesAt) => Promise<void>) => Promise<void>;
  clock: () => Date;
  password: string;
};

/** The demo through the services of anyone's work; what is there already is left as it is. */
export async function seedDemo({ owner, member, together, clock, password }: DemoParts): Promise<void> {
  const founder = owner ?? (await member.foundFirm(demoFirm, { ...demoOwner, password }));
  const there = await member.list(founder);
  for (const person of demoPeople) {
    const isThere = there.some(({ email }) => email === person.email);
    if (!isThere) there.push(await member.addMember(founder, { ...person, password }));
  }
  const estimator = there.find(({ email }) => email === demoEstimator.email) ?? founder;
  await together(founder.firmId, (servicesAt) => seedJob({ servicesAt, member: estimator, today: clock() }));
}

type Seeding = { servicesAt: ServicesAt; member: Member; today: Date };

async function seedJob({ servicesAt, member, today }: Seeding): Promise<void> {
  const sentAt = momentOf(dayFrom(today, { zone: demoZone, days: demoDays.revisionA }), demoTimes.revisionA, demoZone);
  const then = { services: servicesAt(() => sentAt), member, today };
  if ((await then.services.job.list(member)).some(({ number }) => number === demoJob.number)) return;
  const entered = await enterJob(then);
  await sendRevisionA(then, entered);
  await enterAddendum({ ...then, services: servicesAt(() => today) }, entered);
}
