import type { Revision } from '@/api/contracts/revision';
import type { Member } from '@/api/contracts/session';
import { wireTogether } from '@/api/wiring';
import { seedDemo, type DemoParts } from '@/db/seeds/demo';
import { dayFrom, momentOf } from '@/db/seeds/demo/days';
import { demoEstimator, demoPeople } from '@/db/seeds/demo/people';
import { createWithFirm } from '@/db/with-firm';

import { password } from '../../support/firm';
import { publicUrl, startStack, type Stack } from '../../support/stack';

const zone = 'Europe/Dublin';
const now = new Date('2027-03-30T09:15:00Z'); // two days after clocks go forward there
const clock = () => now;
let stack: Stack;
let owner: Member | undefined;
beforeAll(async () => {
  stack = await startStack({ clock });
});
afterAll(() => stack.stop());

const together = (): DemoParts['together'] => {
  const { db, boss } = stack;
  return wireTogether({ db, boss, config: { bcryptCost: 4, publicUrl } });
};

/** Seeds as the script does; the founder is remembered as the script finds him again. */
async function seed(change: Partial<DemoParts> = {}): Promise<void> {
  const { member } = stack.services;
  const foundFirm: DemoParts['member']['foundFirm'] = async (firm, founder) => {
    owner = await member.foundFirm(firm, founder);
    return owner;
  };
  await seedDemo({ owner, member: { ...member, foundFirm }, together: together(), clock, password, ...change });
}
const jobs = () => stack.services.job.list(owner!);

it('leaves no job behind when it fails half-way, and can be repeated', async () => {
  const failing: DemoParts['together'] = (firmId, work) =>
    together()(firmId, (servicesAt) =>
      work((at) => {
        const services = servicesAt(at);
        const create = () => Promise.reject(new Error('The line is dead'));
        return { ...services, basis: { ...services.basis, addenda: { create } } };
      }),
    );
  await expect(seed({ together: failing })).rejects.toThrow('The line is dead');
  expect(await jobs()).toEqual([]);
  await seed();
  expect(await jobs()).toMatchObject([{ number: 'BLI-0417', runs: 52, onHold: 1, lastRevision: 'A' }]);
}, 120_000);

it('enters the people once', async () => {
  const people = await stack.services.member.list(owner!);
  expect(people.map(({ email }) => email).toSorted()).toEqual(demoPeople.map(({ email }) => email).toSorted());
});

describe('Revision A', () => {
  let revision: Revision;
  beforeAll(async () => {
    const [job] = await jobs();
    revision = (await stack.services.revision.list(owner!, job!.id))[0]!;
  });

  it('was frozen and sent by the estimator five days ago at 15:40, local time before the clock change', () => {
    expect(revision).toMatchObject({ letter: 'A', frozenBy: demoEstimator.name, runs: 51, supersededBy: null });
    expect(revision.frozenAt).toBe('2027-03-25T15:40:00.000Z');
    expect(revision.frozenAt).toBe(momentOf(dayFrom(now, { zone, days: -5 }), '15:40', zone).toISOString());
    expect(revision.messages).toMatchObject([{ to: { email: 'marisel@quonder.example' }, state: 'waiting' }]);
  });

  it('knows neither R34 nor white paint, while the job does', async () => {
    const { db, boss } = stack;
    const [job] = await jobs();
    const [snapshot, data] = await createWithFirm({ db, boss })(owner!.firmId, async ({ revisions, jobData }) => [
      await revisions.snapshot(revision.id),
      await jobData.load(job!.id),
    ]);
    expect(JSON.stringify(snapshot)).not.toMatch(/"R34"|white-painted-aluminium/);
    expect(data!.runs.some(({ number }) => number === 'R34')).toBe(true);
    const roof = data!.specification.find(({ label }) => label === 'P22');
    expect(roof).toMatchObject({ finishId: 'std/white-painted-aluminium', version: 2 });
    expect(data!.addenda).toMatchObject([{ number: 1, date: '2027-03-27', acknowledged: true }]);
    expect(data!.job.bidDue).toEqual({ date: '2027-04-01', time: '14:00', zone });
  });
});

it('does nothing when it is run again', async () => {
  const [before] = await jobs();
  const held = await stack.services.run.list(owner!, before!.id);
  await seed();
  expect(await jobs()).toEqual([before]);
  expect(await stack.services.run.list(owner!, before!.id)).toEqual(held);
}, 60_000);
