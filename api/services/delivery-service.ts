import type { Clock } from '@/api/adapters/clock';
import type { Delivery, Envelope, Smtp } from '@/api/adapters/smtp';
import type { MessageState } from '@/api/contracts/revision';
import type { HeldMessage } from '@/db/repositories/outgoing-repository';
import type { Behind, WithFirm } from '@/db/with-firm';

import { compose, envelopeOf, type MailSettings } from './composing';

/** How long a claim holds, and how long to wait before each next try; in seconds. */
export type Patience = { lease: number; backOff: (attempt: number) => number; attempts: number };
/** Half a minute, then twice as long each time up to half an hour: a day and a night in all. */
export const patience: Patience = {
  lease: 180,
  backOff: (attempt) => Math.min(30 * 2 ** (attempt - 1), 1800),
  attempts: 50,
};

type SendJob = { firmId: string; messageId: string };
type Parts = { withFirm: WithFirm; clock: Clock; smtp: Smtp; settings: MailSettings; patience?: Patience };
type Claimed = SendJob & { attempts: number; envelope: Envelope; bytes: Buffer };

/**
 * Hands a message to the mail server: claimed and composed in one transaction, sent outside of any, its answer
 * recorded in a second one. A claim that was never answered is "perhaps sent": it is never sent again by itself.
 */
export function createDeliveryService({ withFirm, clock, smtp, settings, patience: given = patience }: Parts) {
  const claim = (job: SendJob): Promise<Claimed | null> =>
    withFirm(job.firmId, async (behind) => {
      const message = await behind.outgoing.hold(job.messageId);
      if (message?.state === 'sending') await expire(behind, message, clock().getTime() - given.lease * 1000);
      if (message?.state !== 'waiting') return null;
      return claimWaiting(behind, job, message);
    });

  async function claimWaiting(behind: Behind, job: SendJob, message: HeldMessage): Promise<Claimed | null> {
    const revision = await behind.revisions.find(message.revisionId);
    if (revision?.rendering !== 'ready') {
      const why = revision?.rendering === 'failed' ? waitsForFailed : waitsForPdf;
      if (message.answer !== why) await behind.messages.setState(message.id, { state: 'waiting', answer: why });
      return null;
    }
    const at = clock();
    const bytes =
      (await behind.outgoing.bytes(message.id)) ?? (await compose(behind, { message, revision, at, settings }));
    await behind.outgoing.claim(message.id, at);
    // should this worker be killed, this job finds the claim unanswered
    await behind.enqueue('send', job, { after: given.lease + 1 });
    const envelope = await envelopeOf(behind, message, settings);
    return { ...job, attempts: message.attempts + 1, envelope, bytes };
  }

  const record = ({ firmId, messageId, attempts }: Claimed, delivery: Delivery): Promise<void> =>
    withFirm(firmId, async ({ outgoing, enqueue }) => {
      const state = stateAfter(delivery, attempts < given.attempts);
      const states: MessageState[] = delivery.kind === 'taken' ? ['sending', 'perhaps-sent'] : ['sending'];
      const sentAt = state === 'sent' ? clock() : null;
      const change = { state, answer: delivery.answer.slice(0, 1000), sentAt };
      const isOurs = await outgoing.settleAttempt({ id: messageId, attempts, states }, change);
      if (isOurs && state === 'waiting')
        await enqueue('send', { firmId, messageId }, { after: given.backOff(attempts) });
    });

  return {
    async deliver(job: SendJob): Promise<void> {
      const claimed = await claim(job);
      if (claimed) await record(claimed, await smtp.deliver(claimed.envelope, claimed.bytes));
    },
  };
}
export type DeliveryService = ReturnType<typeof createDeliveryService>;

const waitsForPdf = 'Waits for the PDF, which is being made.';
const waitsForFailed = 'Waits: the PDF could not be made yet.';
const neverAnswered =
  'The mail was handed over, but the mail server’s answer was never recorded. Ask the recipient, then settle it here.';

async function expire({ messages }: Behind, { id, claimedAt }: HeldMessage, before: number): Promise<void> {
  if (claimedAt && claimedAt.getTime() <= before)
    await messages.setState(id, { state: 'perhaps-sent', answer: neverAnswered });
}

function stateAfter({ kind }: Delivery, mayTryAgain: boolean): MessageState {
  if (kind === 'taken') return 'sent';
  if (kind === 'refused') return 'refused';
  if (kind === 'unknown') return 'perhaps-sent';
  return mayTryAgain ? 'waiting' : 'not-sent';
}
