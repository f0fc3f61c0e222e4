import type { Clock } from '@/api/adapters/clock';
import type { Contact } from '@/api/contracts/contact';
import { snapshotSchema, type Revision } from '@/api/contracts/revision';
import type { MailPreview, SendInput } from '@/api/contracts/sending';
import type { Member } from '@/api/contracts/session';
import { takeoffFileName } from '@/api/documents/file-name';
import { takeoffMail } from '@/api/documents/mail/takeoff-mail';
import { AppError } from '@/api/errors';
import type { BareRevision } from '@/db/repositories/revision-repository';
import type { Behind, WithFirm } from '@/db/with-firm';

import { allow } from './allow';
import { dateIn } from './calendar';
import { listFields, refuse } from './field-problems';
import { must } from './job-rows';
import { withMessages } from './revision-rows';
import { noSuchRevision } from './revision-service';

type Parts = { withFirm: WithFirm; clock: Clock; publicUrl: string };
type Asked = { member: Member; revision: BareRevision; input: SendInput };

/** Sending a frozen takeoff: one message for each contact, queued with its record. */
export function createRevisionSending({ withFirm, clock, publicUrl }: Parts) {
  async function preview({ revisions }: Behind, { member, revision, input }: Asked): Promise<MailPreview> {
    const snapshot = snapshotSchema.parse(await revisions.snapshot(revision.id));
    const date = dateIn(new Date(revision.frozenAt), snapshot.timeZone);
    return takeoffMail({
      ...input,
      snapshot,
      sender: member,
      link: `${publicUrl}/links/…`,
      fileName: takeoffFileName({ number: snapshot.job.number, letter: revision.letter, date }),
    });
  }

  async function send(behind: Behind, { member, revision, input }: Asked): Promise<Revision> {
    const chosen = await recipients(behind, revision.jobId, input);
    checkCurrent(revision, clock());
    await checkNew(behind, revision, input);
    for (const contact of chosen) {
      const messageId = await behind.messages.insert({
        revisionId: revision.id,
        contactId: contact.id,
        to: contact,
        sender: member,
        subject: input.subject,
        words: input.words,
        askedAt: clock(),
      });
      await behind.enqueue('send', { firmId: member.firmId, messageId });
    }
    return withMessages(revision, await behind.messages.ofRevisions([revision.id]));
  }

  return {
    /** How the mail reads: the same as the one that goes out, but for each recipient's own link. */
    preview(member: Member, revisionId: string, input: SendInput): Promise<MailPreview> {
      allow(member, 'revise');
      return withFirm(member.firmId, async (behind) => {
        const revision = await behind.revisions.find(revisionId);
        if (!revision) throw noSuchRevision();
        await recipients(behind, revision.jobId, input);
        return preview(behind, { member, revision, input });
      });
    },
    /** @throws AppError `conflict` when a contact has this revision already and nobody said "again" */
    send(member: Member, revisionId: string, input: SendInput): Promise<Revision> {
      allow(member, 'send');
      return withFirm(member.firmId, async (behind) => {
        if (!(await behind.revisions.hold(revisionId))) throw noSuchRevision();
        const revision = must(await behind.revisions.find(revisionId));
        return send(behind, { member, revision, input });
      });
    },
  };
}

/** Only the job's own contacts, each once. */
async function recipients({ contacts }: Behind, jobId: string, { contactIds }: SendInput): Promise<Contact[]> {
  const ofJob = await contacts.ofJob(jobId);
  const known = new Set(ofJob.map(({ id }) => id));
  refuse(listFields('contactIds', contactIds, known));
  return ofJob.filter(({ id }) => contactIds.includes(id));
}

function checkCurrent({ letter, supersededBy, validUntil, expiresAt }: BareRevision, now: Date): void {
  if (supersededBy !== null)
    throw new AppError('conflict', `Revision ${supersededBy} has replaced Revision ${letter}: send that one`);
  if (expiresAt <= now)
    throw new AppError('conflict', `Revision ${letter} was valid to ${validUntil}: freeze a new one`);
}

async function checkNew({ messages }: Behind, { id, letter }: BareRevision, input: SendInput): Promise<void> {
  if (input.again) return;
  const reached = await messages.reached(id, input.contactIds);
  if (reached.length === 0) return;
  const words = `${reached.join(', ')} has Revision ${letter} already, or it is on its way`;
  throw new AppError('conflict', words, { fields: { contactIds: words } });
}
