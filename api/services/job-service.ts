import type { Job, JobInput, JobSummary } from '@/api/contracts/job';
import type { Member } from '@/api/contracts/session';
import { AppError } from '@/api/errors';
import type { RowSeen } from '@/db/repositories/job-rows';
import type { Behind, WithFirm } from '@/db/with-firm';

import { allow } from './allow';
import { listFields, refuse } from './field-problems';
import { holdJob, must, noSuchJob } from './job-rows';
import { editionFields } from './library-checks';

export function createJobService({ withFirm }: { withFirm: WithFirm }) {
  async function check({ jobs, contacts }: Behind, input: JobInput, id: string | null): Promise<void> {
    const known = await contacts.known(input.contactIds);
    const taken = await jobs.isTaken(input.number, id);
    refuse({
      ...(taken ? { number: 'Another job has this number' } : {}),
      ...listFields('contactIds', input.contactIds, known),
      ...editionFields('codeEdition', input.codeEdition),
    });
  }
  return {
    list(member: Member): Promise<JobSummary[]> {
      allow(member, 'see-jobs');
      return withFirm(member.firmId, ({ jobs }) => jobs.list());
    },
    create(member: Member, input: JobInput): Promise<Job> {
      allow(member, 'edit-jobs');
      return withFirm(member.firmId, async (behind) => {
        await check(behind, input, null);
        return behind.jobs.insert(input);
      });
    },
    /** @throws AppError `not-found` when this firm has no such job */
    get(member: Member, id: string): Promise<Job> {
      allow(member, 'see-jobs');
      return withFirm(member.firmId, async ({ jobs }) => {
        const job = await jobs.find(id);
        if (!job) throw noSuchJob();
        return job;
      });
    },
    /** @throws AppError `stale` with the row as it is now */
    change(member: Member, { id, version }: RowSeen, input: JobInput): Promise<Job> {
      allow(member, 'edit-jobs');
      return withFirm(member.firmId, async (behind) => {
        await holdJob(behind, id);
        const current = must(await behind.jobs.find(id));
        if (current.version !== version) throw new AppError('stale', undefined, { current });
        await check(behind, input, id);
        return must(await behind.jobs.update({ id, version }, input));
      });
    },
  };
}
export type JobService = ReturnType<typeof createJobService>;
