import bcrypt from 'bcrypt';
import { createHash, randomBytes } from 'node:crypto';

import type { Clock } from '@/api/adapters/clock';
import type { Firm, Member, Session, SessionChange, SignIn } from '@/api/contracts/session';
import { AppError } from '@/api/errors';
import type { Doors } from '@/db/repositories/doors';
import type { WithFirm } from '@/db/with-firm';

type SessionServiceParts = { withFirm: WithFirm; doors: Doors; clock: Clock; bcryptCost: number };

const triesInARow = 10;
const waitSeconds = 15 * 60;

export function createSessionService({ withFirm, doors, clock, bcryptCost }: SessionServiceParts) {
  // an unknown address costs the same comparison as a known one
  const nobody = bcrypt.hash(randomBytes(16).toString('hex'), bcryptCost);
  return {
    /** @throws AppError `wrong-password`, the same for an unknown address; `too-many-tries` with the wait */
    async signIn({ email, password }: SignIn): Promise<{ accountId: string; firmId: string }> {
      const key = `sign-in ${createHash('sha256').update(email.toLowerCase()).digest('hex')}`;
      const wait = await doors.countTry(key, { moment: clock(), most: triesInARow, seconds: waitSeconds });
      if (wait > 0) throw tooManyTries(wait);
      const account = await doors.signIn(email);
      const matches = await bcrypt.compare(password, account?.password_hash ?? (await nobody));
      if (!account || !matches) throw new AppError('wrong-password');
      await doors.forgetTries(key);
      return { accountId: account.account_id, firmId: account.firm_id };
    },
    /** Who asks, as the firm has them at this moment; undefined when they are no longer one of its people. */
    member: (firmId: string, accountId: string): Promise<Member | undefined> =>
      withFirm(firmId, ({ members }) => members.find(accountId)),
    session: (member: Member): Promise<Session> =>
      withFirm(member.firmId, async ({ firm }) => toSession(member, await firm.get())),
    change: (member: Member, { units }: SessionChange): Promise<Session> =>
      withFirm(member.firmId, async ({ firm, members }) => {
        await members.setUnits(member.accountId, units);
        return toSession({ ...member, units }, await firm.get());
      }),
  };
}
export type SessionService = ReturnType<typeof createSessionService>;

function tooManyTries(seconds: number): AppError {
  const minutes = Math.ceil(seconds / 60);
  const wait = minutes === 1 ? 'a minute' : `${minutes} minutes`;
  return new AppError('too-many-tries', `Too many tries with this address. Try again in ${wait}.`, {
    retryAfter: seconds,
  });
}

function toSession(member: Member, firm: Firm): Session {
  const { accountId, name, email, role, maySend, seesMargin, units } = member;
  const { id, town, currency, locale, paper, timeZone } = firm;
  return {
    member: { accountId, name, email, role, maySend, seesMargin, units },
    firm: { id, name: firm.name, town, currency, locale, paper, timeZone },
  };
}
