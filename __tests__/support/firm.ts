import { randomUUID } from 'node:crypto';
import request from 'supertest';

import type { Role } from '@/api/contracts/permission';
import type { FirmInput, Member } from '@/api/contracts/session';
import type { Services } from '@/api/services/services';

import type { Stack } from './stack';

export const password = 'a long password of the tests';

const firmInput: FirmInput = {
  name: 'Test firm',
  town: 'Testerton',
  address: '1 Test Street',
  email: 'office@test-firm.example',
  phone: '',
  currency: 'EUR',
  locale: 'en-IE',
  paper: 'A4',
  timeZone: 'Europe/Dublin',
  units: 'SI',
  quotePrefix: 'TST',
  quoteValidDays: 45,
  recordAddress: 'records@test-firm.example',
};

const newAddress = () => `${randomUUID()}@test-firm.example`;

/** A fresh firm with its owner, so that no test meets another's rows. */
export const newFirm = (services: Services): Promise<Member> =>
  services.member.foundFirm(firmInput, { name: 'Olive Owner', email: newAddress(), password });

/** One more person of the owner's firm. */
export const newMember = (
  services: Services,
  owner: Member,
  as: { role: Role; maySend?: boolean; seesMargin?: boolean },
) =>
  services.member.addMember(owner, {
    name: `A ${as.role}`,
    email: newAddress(),
    role: as.role,
    maySend: as.maySend ?? false,
    seesMargin: as.seesMargin ?? false,
    password,
  });

/** A browser of this member: signed in, with the header that every write needs. */
export async function signedIn({ app }: Pick<Stack, 'app'>, { email }: Pick<Member, 'email'>) {
  const agent = request.agent(app).set('X-Thickset', '1');
  await agent.post('/api/session').send({ email, password }).expect(204);
  return agent;
}
