import bcrypt from 'bcrypt';

import type { FirmInput, Member, MemberInput } from '@/api/contracts/session';
import { AppError } from '@/api/errors';
import type { Doors } from '@/db/repositories/doors';
import type { WithFirm } from '@/db/with-firm';

import { allow } from './allow';

type MemberServiceParts = { withFirm: WithFirm; doors: Doors; bcryptCost: number };
type Owner = Pick<MemberInput, 'name' | 'email' | 'password'>;

export function createMemberService({ withFirm, doors, bcryptCost }: MemberServiceParts) {
  const find = async (firmId: string, accountId: string): Promise<Member> => {
    const member = await withFirm(firmId, ({ members }) => members.find(accountId));
    if (!member) throw new AppError('not-found', 'This person is not of the firm');
    return member;
  };
  return {
    /** A new firm with its first owner. @throws AppError `conflict` when the address already signs in somewhere */
    async foundFirm(firm: FirmInput, { name, email, password }: Owner): Promise<Member> {
      const founded = await doors.foundFirm(firm, {
        name,
        email,
        passwordHash: await bcrypt.hash(password, bcryptCost),
      });
      if (!founded) throw addressTaken();
      return find(founded.firmId, founded.accountId);
    },
    /** One more person of the owner's firm. @throws AppError `conflict` when the address already signs in somewhere */
    async addMember(owner: Member, { password, ...person }: MemberInput): Promise<Member> {
      allow(owner, 'manage-firm');
      const passwordHash = await bcrypt.hash(password, bcryptCost);
      const accountId = await withFirm(owner.firmId, ({ members }) => members.add({ ...person, passwordHash }));
      if (!accountId) throw addressTaken();
      return find(owner.firmId, accountId);
    },
    list(member: Member): Promise<Member[]> {
      allow(member, 'see-jobs');
      return withFirm(member.firmId, ({ members }) => members.list());
    },
  };
}
export type MemberService = ReturnType<typeof createMemberService>;

const addressTaken = () =>
  new AppError('conflict', 'This address already signs in', { fields: { email: 'This address already signs in' } });
