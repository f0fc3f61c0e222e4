import type { Clock } from '@/api/adapters/clock';
import type { Message, MessageState } from '@/api/contracts/revision';
import type { SettleInput } from '@/api/contracts/sending';
import type { Member } from '@/api/contracts/session';
import { AppError } from '@/api/errors';
import type { HeldMessage } from '@/db/repositories/outgoing-repository';
import type { Behind, WithFirm } from '@/db/with-firm';

import { allow } from './allow';
import { must } from './job-rows';

type Settled = SettleInput['as'];

/** What a person may say of a message in each state: only what may have been taken needs settling. */
const settlements: Record<MessageState, readonly Settled[]> = {
  waiting: ['not-sent'],
  sending: [],
  sent: [],
  'perhaps-sent': ['sent', 'send-again', 'not-sent'],
  refused: ['send-again'],
  'not-sent': ['send-again'],
};

/** Messages on their way: settled by a person, and their links revoked. */
export function createMessageService({ withFirm, clock }: { withFirm: WithFirm; clock: Clock }) {
  async function held({ outgoing }: Behind, id: string): Promise<HeldMessage> {
    const message = await outgoing.hold(id);
    if (!message) throw new AppError('not-found', 'This message does not exist');
    return message;
  }

  async function settle(behind: Behind, { member, message, as }: Settling): Promise<Message> {
    const by = `Settled by ${member.name}`;
    if (as === 'send-again') {
      await behind.messages.setState(message.id, { state: 'waiting', answer: `${by}: send again.` });
      await behind.enqueue('send', { firmId: member.firmId, messageId: message.id });
    } else if (as === 'sent') {
      await behind.messages.setState(message.id, {
        state: 'sent',
        answer: `${by}: it arrived.`,
        sentAt: message.claimedAt,
      });
    } else await behind.messages.setState(message.id, { state: 'not-sent', answer: `${by}: not sent.` });
    return must(await behind.messages.find(message.id));
  }

  return {
    /** @throws AppError `stale` with the message as it is now; `conflict` when there is nothing to settle */
    settle(member: Member, id: string, { as, version }: SettleInput): Promise<Message> {
      allow(member, 'send');
      return withFirm(member.firmId, async (behind) => {
        const message = await held(behind, id);
        if (message.version !== version)
          throw new AppError('stale', undefined, { current: must(await behind.messages.find(id)) });
        if (!settlements[message.state].includes(as))
          throw new AppError('conflict', `A message that is ${stateWords[message.state]} cannot be settled like this`);
        return settle(behind, { member, message, as });
      });
    },
    /** The link stops to open at once. @throws AppError `conflict` when there is none, or it was revoked before */
    revokeLink(member: Member, id: string): Promise<Message> {
      allow(member, 'send');
      return withFirm(member.firmId, async (behind) => {
        await held(behind, id);
        if (!(await behind.links.revoke(id, clock())))
          throw new AppError('conflict', 'This message has no link that still opens');
        return must(await behind.messages.find(id));
      });
    },
  };
}
export type MessageService = ReturnType<typeof createMessageService>;

type Settling = { member: Member; message: HeldMessage; as: Settled };
const stateWords: Record<MessageState, string> = {
  waiting: 'waiting',
  sending: 'being sent',
  sent: 'sent',
  'perhaps-sent': 'perhaps sent',
  refused: 'refused',
  'not-sent': 'not sent',
};
