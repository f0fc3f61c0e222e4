import type { Contact, ContactInput } from '@/api/contracts/contact';
import type { Member } from '@/api/contracts/session';
import { AppError } from '@/api/errors';
import type { RowSeen } from '@/db/repositories/job-rows';
import type { Behind, WithFirm } from '@/db/with-firm';

import { allow } from './allow';
import { must } from './job-rows';

/** The firm's clients: they stand in jobs, and enter only through a private link. */
export function createContactService({ withFirm }: { withFirm: WithFirm }) {
  async function current({ contacts }: Behind, { id, version }: RowSeen): Promise<Contact> {
    const contact = await contacts.hold(id);
    if (!contact) throw new AppError('not-found', 'This contact does not exist');
    if (contact.version !== version) throw new AppError('stale', undefined, { current: contact });
    return contact;
  }
  return {
    list(member: Member): Promise<Contact[]> {
      allow(member, 'see-jobs');
      return withFirm(member.firmId, ({ contacts }) => contacts.list());
    },
    create(member: Member, input: ContactInput): Promise<Contact> {
      allow(member, 'edit-jobs');
      return withFirm(member.firmId, ({ contacts }) => contacts.insert(input));
    },
    /** @throws AppError `stale` with the row as it is now */
    change(member: Member, seen: RowSeen, input: ContactInput): Promise<Contact> {
      allow(member, 'edit-jobs');
      return withFirm(member.firmId, async (behind) => {
        await current(behind, seen);
        return must(await behind.contacts.update(seen, input));
      });
    },
    /** @throws AppError `conflict` when a job names the contact, or something was sent to it */
    remove(member: Member, seen: RowSeen): Promise<void> {
      allow(member, 'edit-jobs');
      return withFirm(member.firmId, async (behind) => {
        await current(behind, seen);
        const jobs = await behind.contacts.jobsNaming(seen.id);
        if (jobs.length > 0) throw new AppError('conflict', inUse(jobs));
        if (await behind.messages.everSentTo(seen.id)) {
          throw new AppError('conflict', 'A takeoff was sent to this contact: the record names it');
        }
        await behind.contacts.remove(seen);
      });
    },
  };
}
export type ContactService = ReturnType<typeof createContactService>;

const inUse = (jobs: readonly string[]) =>
  jobs.length === 1 ? `Job ${jobs[0]} names this contact` : `Jobs ${jobs.join(', ')} name this contact`;
