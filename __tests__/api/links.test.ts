import { simpleParser } from 'mailparser';
import request from 'supertest';

import { linkViewSchema } from '@/api/contracts/link';
import { sha256, tokenHash } from '@/api/services/hashes';
import { familyOf, networkOf } from '@/api/routes/link-routes';

import { openPostOffice, type PostOffice } from '../support/post-office';
import { deliveryWith, freeze, newMessage } from '../support/sending';
import { startStack, type Stack } from '../support/stack';

jest.setTimeout(60_000);
let moment = new Date('2026-03-12T12:00:00Z');
let stack: Stack;
let office: PostOffice;
beforeAll(async () => {
  stack = await startStack({ clock: () => moment });
  office = await openPostOffice();
});
beforeEach(() => {
  moment = new Date('2026-03-12T12:00:00Z');
});
afterAll(() => Promise.all([stack.stop(), office.close()]));

/** A takeoff that reached its client: the token stands in the mail, and nowhere else. */
async function newLink() {
  const sent = await newMessage(stack);
  await deliveryWith(stack, office.smtp).deliver(sent.sendJob);
  const mail = await simpleParser(office.taken.at(-1)!.bytes);
  const token = /\/links\/([\w-]+)/.exec(mail.text ?? '')?.[1] ?? '';
  return { ...sent, token };
}
const visit = (path: string) =>
  request(stack.app).get(`/api/links/${path}`).set('User-Agent', 'Mozilla/5.0 Firefox/140.0');

it('opens without an account, and shows what was sent and no more', async () => {
  const { token, revision } = await newLink();
  expect(token).toMatch(/^[\w-]{43}$/);
  const answer = await visit(token).expect(200);
  const view = linkViewSchema.strict().parse(answer.body);
  expect(view).toMatchObject({ state: 'current', supersededBy: null, contact: { name: 'Clara Client 0' } });
  expect(view.sent?.letter).toBe('A');
  expect(view.sent?.job.codeEdition).toBe('ASHRAE 90.1-2019');
  expect(view.sent?.schedule.rows.length).toBeGreaterThan(0);
  expect(view.sent?.conditions[0]?.words.length).toBeGreaterThan(4);
  expect(Object.keys(answer.body.sent).sort()).toEqual([
    'cautions',
    'clarifications',
    'conditions',
    'engineVersion',
    'frozenAt',
    'job',
    'letter',
    'letterhead',
    'method',
    'preparedBy',
    'schedule',
    'takeoff',
    'timeZone',
    'validUntil',
  ]);
  expect(JSON.stringify(answer.body)).not.toContain('clara-0@client.example');
  expect(answer.headers).toMatchObject({
    'x-robots-tag': 'noindex, nofollow, noarchive',
    'referrer-policy': 'no-referrer',
    'cache-control': 'no-store',
  });
  expect(answer.headers['set-cookie']).toBeUndefined();
  const pdf = await visit(`${token}/pdf`).buffer().expect(200);
  const { rows } = await stack.owner.raw('select pdf_hash from revisions where id = ?', [revision.id]);
  expect(sha256(pdf.body)).toBe(rows[0].pdf_hash);
  expect(pdf.headers).toMatchObject({
    'content-disposition': 'attachment; filename="TST-001-Rev-A-takeoff-2026-03-12.pdf"',
    'cache-control': 'no-store',
  });
});

it('keeps only the token’s hash', async () => {
  const { token } = await newLink();
  const { rows } = await stack.owner.raw('select l::text as all, token_hash from links l where token_hash = ?', [
    tokenHash(token),
  ]);
  expect(rows).toHaveLength(1);
  expect(rows[0].all).not.toContain(token);
  // the app's role sees no link outside of its firm's transaction
  expect((await stack.db.raw('select * from links')).rows).toEqual([]);
});

it('records each opening, coarsely, and tells the estimator', async () => {
  const { token, now, message } = await newLink();
  expect((await now()).link).toMatchObject({ openings: 0, lastOpenedAt: null, expiresAt: '2026-04-26T23:00:00.000Z' });
  await visit(token).expect(200);
  moment = new Date('2026-03-13T08:00:00Z');
  await visit(token).expect(200);
  await visit(`${token}/pdf`).expect(200);
  expect((await now()).link).toMatchObject({ openings: 2, lastOpenedAt: moment.toISOString() });
  const { rows } = await stack.owner.raw(
    'select o.* from link_openings o join links l on l.id = o.link_id where l.message_id = ?',
    [message.id],
  );
  expect(rows.map(({ what, address, agent }: Record<string, string>) => [what, address, agent])).toEqual([
    ['page', '127.0.0.0', 'Firefox'],
    ['page', '127.0.0.0', 'Firefox'],
    ['pdf', '127.0.0.0', 'Firefox'],
  ]);
});

it('says that a newer revision has replaced this one, and still shows it', async () => {
  const { token, agent, path } = await newLink();
  await freeze({ agent, path });
  const { body } = await visit(token).expect(200);
  expect(body).toMatchObject({ state: 'superseded', supersededBy: 'B', sent: { letter: 'A' } });
  await visit(`${token}/pdf`).expect(200);
});

it('says that it has expired, and shows nothing', async () => {
  const { token } = await newLink();
  moment = new Date('2026-04-26T22:59:00Z');
  expect((await visit(token)).body.state).toBe('current');
  moment = new Date('2026-04-26T23:00:00Z');
  expect((await visit(token)).body).toMatchObject({ state: 'expired', sent: null });
  await visit(`${token}/pdf`).expect(404);
});

it('says that it was revoked, and shows nothing from then on', async () => {
  const { token, agent, message } = await newLink();
  const { body } = await agent.post(`/api/messages/${message.id}/link-revocation`).send({}).expect(200);
  expect(body.link.revokedAt).toBe(moment.toISOString());
  expect((await visit(token)).body).toMatchObject({ state: 'revoked', sent: null });
  await visit(`${token}/pdf`).expect(404);
  await agent.post(`/api/messages/${message.id}/link-revocation`).send({}).expect(409);
});

it.each([
  ['too short', 'x'],
  ['of the right form', 'A'.repeat(43)],
  ['far too long', 'A'.repeat(5000)],
  ['with a zero byte', '%00'],
  ['with SQL', "'%20or%201=1"],
  ['with an emoji', '%F0%9F%8F%8A'],
])('has nothing under a token that is %s, and says no more', async (_case, token) => {
  const answer = await visit(token).expect(404);
  expect(answer.body.detail).toBe('This link does not exist, or no longer opens');
  expect(answer.headers['x-robots-tag']).toContain('noindex');
  await visit(`${token}/pdf`).expect(404);
});

it('stops who tries tokens', async () => {
  const own = await startStack();
  const statuses: number[] = [];
  for (let tries = 0; tries < 45; tries += 1)
    statuses.push((await request(own.app).get(`/api/links/guess-${tries}`)).status);
  expect(statuses.filter((status) => status === 404)).toHaveLength(40);
  expect(statuses.slice(40)).toEqual([429, 429, 429, 429, 429]);
  await own.stop();
});

it('keeps a network and a family of browsers, not a machine', () => {
  expect(
    ['203.0.113.77', '::ffff:203.0.113.77', '2001:db8:85a3:8d3:1319:8a2e:370:7348', 'nonsense'].map(networkOf),
  ).toEqual(['203.0.113.0', '203.0.113.0', '2001:db8:85a3::', '']);
  expect(
    [
      'Mozilla/5.0 Edg/120',
      'Mozilla/5.0 Chrome/120 Safari/537',
      'Mozilla/5.0 Version/17 Safari/605',
      'SafeLinkScanBot',
      '',
    ].map(familyOf),
  ).toEqual(['Edge', 'Chrome', 'Safari', 'robot', 'other']);
});
