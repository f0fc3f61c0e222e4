import { randomBytes, randomUUID } from 'node:crypto';

import type { Envelope } from '@/api/adapters/smtp';
import { snapshotSchema } from '@/api/contracts/revision';
import type { Firm } from '@/api/contracts/session';
import { takeoffFileName } from '@/api/documents/file-name';
import { composeMime } from '@/api/documents/mail/mime';
import { takeoffMail } from '@/api/documents/mail/takeoff-mail';
import type { HeldMessage } from '@/db/repositories/outgoing-repository';
import type { BareRevision } from '@/db/repositories/revision-repository';
import type { Behind } from '@/db/with-firm';

import { sha256, tokenHash } from './hashes';
import { must } from './job-rows';

/** `mailFrom`: the sender where a firm has no record address of its own. */
export type MailSettings = { publicUrl: string; mailFrom: string };
type Composing = { message: HeldMessage; revision: BareRevision; at: Date; settings: MailSettings };

/** Makes a message's private link and its exact bytes, once, and stores them; of the link's token only the hash. */
export async function compose(behind: Behind, { message, revision, at, settings }: Composing): Promise<Buffer> {
  const firm = await behind.firm.get();
  const pdf = must(await behind.revisions.pdf(revision.id));
  const snapshot = snapshotSchema.parse(await behind.revisions.snapshot(revision.id));
  const token = randomBytes(32).toString('base64url');
  await behind.links.insert({ messageId: message.id, tokenHash: tokenHash(token), expiresAt: revision.expiresAt });
  const fileName = takeoffFileName(pdf);
  const from = { name: firm.name, address: senderOf(firm, settings) };
  const messageId = `<${randomUUID()}@${from.address.split('@').at(-1) ?? 'localhost'}>`;
  const bytes = await composeMime({
    from,
    to: { name: message.to.name, address: message.to.email },
    replyTo: { name: message.sender.name, address: message.sender.email },
    mail: takeoffMail({ ...message, snapshot, link: `${settings.publicUrl}/links/${token}`, fileName }),
    attachment: { fileName, bytes: pdf.bytes },
    messageId,
    date: at,
  });
  await behind.outgoing.storeBytes(message.id, { bytes, hash: sha256(bytes), messageId });
  return bytes;
}

export async function envelopeOf({ firm }: Behind, { to }: HeldMessage, settings: MailSettings): Promise<Envelope> {
  return { from: senderOf(await firm.get(), settings), to: to.email };
}

/** The firm's record address, else the address of the configuration. */
const senderOf = ({ recordAddress }: Firm, { mailFrom }: MailSettings): string =>
  recordAddress || (/<([^<>]+)>/.exec(mailFrom)?.[1] ?? mailFrom);
