import { createHash } from 'node:crypto';
import { simpleParser } from 'mailparser';

import { revisionSchema } from '@/api/contracts/revision';

import { closedOffice, openHangingUp, openPostOffice, type Answer, type PostOffice } from '../support/post-office';
import {
  deliveryWith,
  freeze,
  newDesk,
  newMessage,
  queued,
  render,
  send,
  settle,
  storedBytes,
  words,
} from '../support/sending';
import { startStack, type Stack } from '../support/stack';

jest.setTimeout(60_000); // a machine with many things to do

let stack: Stack;
const offices: PostOffice[] = [];
beforeAll(async () => {
  stack = await startStack();
});
afterEach(() => Promise.all(offices.splice(0).map(({ close }) => close())));
afterAll(() => stack.stop());

const hash = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');
async function office(answers: Answer[] = []) {
  const opened = await openPostOffice(answers);
  offices.push(opened);
  return { ...opened, delivery: deliveryWith(stack, opened.smtp) };
}

it('sends exactly the bytes that are stored: both forms, the stored PDF, the link, answers to the estimator', async () => {
  const { agent, estimator, message, sendJob, revision, now } = await newMessage(stack);
  const { delivery, taken } = await office();
  await delivery.deliver(sendJob);
  await delivery.deliver(sendJob);
  expect(taken).toHaveLength(1);
  const { from, to, bytes } = taken[0]!;
  expect([from, to]).toEqual(['records@test-firm.example', ['clara-0@client.example']]);
  expect(bytes.equals(await storedBytes(stack, message))).toBe(true);

  const mail = await simpleParser(bytes);
  expect(mail.from?.value).toEqual([{ name: 'Test firm', address: 'records@test-firm.example' }]);
  expect(mail.replyTo?.value).toEqual([{ name: estimator.name, address: estimator.email }]);
  expect(mail.subject).toBe(words.subject);
  expect(mail.text).toContain('please find our takeoff.');
  expect(mail.text).toMatch(/http:\/\/localhost:4000\/links\/[\w-]{43}\n/);
  expect(mail.html).toMatch(/href="http:\/\/localhost:4000\/links\/[\w-]{43}"/);
  expect(mail.html).not.toMatch(/<img|<link|<script|url\(|src=/);
  expect(mail.text).toContain('estimates for steady conditions');
  expect(mail.attachments).toHaveLength(1);
  const [attachment] = mail.attachments;
  const pdf = await agent.get(`/api/revisions/${revision.id}/pdf`).buffer().expect(200);
  expect(hash(attachment!.content)).toBe((await agent.get(`/api/revisions/${revision.id}`)).body.pdfHash);
  expect(attachment!.content.equals(pdf.body)).toBe(true);
  expect(attachment!.filename).toMatch(/^TST-001-Rev-A-takeoff-\d{4}-\d\d-\d\d\.pdf$/);

  const sent = await now();
  expect(sent).toMatchObject({ state: 'sent', attempts: 1, messageId: mail.messageId });
  expect(sent.answer).toMatch(/^250 /);
  expect(new Date(sent.sentAt!).getTime()).toBeGreaterThan(Date.now() - 60_000);
});

it('tries again while it is certain that nothing was taken, with the same bytes', async () => {
  const { sendJob, now, message } = await newMessage(stack);
  const later: Answer = { at: 'rcpt', code: 450, words: 'Mailbox busy' };
  const { delivery, taken } = await office([later, { at: 'data', code: 451, words: 'Out of space' }]);
  await deliveryWith(stack, closedOffice()).deliver(sendJob);
  expect(await now()).toMatchObject({ state: 'waiting', attempts: 1 });
  expect((await now()).answer).toContain('ECONNREFUSED');
  const bytes = await storedBytes(stack, message);
  await delivery.deliver(sendJob);
  expect(await now()).toMatchObject({ state: 'waiting', attempts: 2, answer: '450 Mailbox busy' });
  // each try queued the next one, and a look whether it was ever answered
  expect(await queued(stack, 'messageId', message.id)).toBe(1 + 2 * 2);
  await deliveryWith(stack, (await office()).smtp).deliver(sendJob);
  expect(await now()).toMatchObject({ state: 'sent', attempts: 3 });
  expect(taken).toHaveLength(0);
  expect((await storedBytes(stack, message)).equals(bytes)).toBe(true);
});

it('gives up after so many tries, and says so', async () => {
  const { sendJob, now, agent } = await newMessage(stack);
  for (let tries = 0; tries < 3; tries += 1) await deliveryWith(stack, closedOffice()).deliver(sendJob);
  const given = await now();
  expect(given).toMatchObject({ state: 'not-sent', attempts: 3 });
  expect(await settle(agent, given, 'send-again')).toMatchObject({ state: 'waiting' });
});

it.each<[string, Answer]>([
  ['the address', { at: 'rcpt', code: 550, words: 'No such user here' }],
  ['the mail', { at: 'data', code: 554, words: 'Looks like spam' }],
])('keeps the server’s words when it refuses %s, and does not try again', async (_what, answer) => {
  const { sendJob, now, message } = await newMessage(stack);
  const { delivery, taken } = await office([answer]);
  const before = await queued(stack, 'messageId', message.id);
  await delivery.deliver(sendJob);
  await delivery.deliver(sendJob);
  const refused = await now();
  expect(refused.state).toBe('refused');
  expect(refused.answer).toContain(answer === 'take' ? '' : `${answer.code} ${answer.words}`);
  expect(taken).toHaveLength(0);
  expect(await queued(stack, 'messageId', message.id)).toBe(before + 1);
});

it('calls it perhaps sent when the connection is lost after the mail, and leaves it to a person', async () => {
  const { agent, sendJob, now, message } = await newMessage(stack);
  const hanging = await openHangingUp('after-data');
  await deliveryWith(stack, hanging.smtp).deliver(sendJob);
  await deliveryWith(stack, hanging.smtp).deliver(sendJob);
  expect(hanging.mails()).toBe(1);
  const unsure = await now();
  expect(unsure).toMatchObject({ state: 'perhaps-sent', attempts: 1, sentAt: null });

  const { delivery, taken } = await office();
  await delivery.deliver(sendJob);
  expect(taken).toHaveLength(0);
  const stale = await agent
    .post(`/api/messages/${message.id}/settle`)
    .send({ as: 'sent', version: unsure.version - 1 })
    .expect(409);
  expect(stale.body).toMatchObject({ type: '/problems/stale', current: { state: 'perhaps-sent' } });
  expect(await settle(agent, unsure, 'send-again')).toMatchObject({ state: 'waiting' });
  await delivery.deliver(sendJob);
  expect(taken).toHaveLength(1);
  expect(taken[0]!.bytes.equals(await storedBytes(stack, message))).toBe(true);
  await agent
    .post(`/api/messages/${message.id}/settle`)
    .send({ as: 'sent', version: (await now()).version })
    .expect(409);
  await hanging.close();
});

it('is certain that nothing was taken by a server that hangs up at once', async () => {
  const { sendJob, now } = await newMessage(stack);
  const hanging = await openHangingUp('greeting');
  await deliveryWith(stack, hanging.smtp).deliver(sendJob);
  expect(await now()).toMatchObject({ state: 'waiting', attempts: 1 });
  await hanging.close();
});

it('waits for the PDF, and goes when it is there', async () => {
  const { agent, estimator, path, contactIds } = await newDesk(stack);
  const revision = await freeze({ agent, path });
  await agent.get(`/api/revisions/${revision.id}/pdf`).expect(503);
  const [message] = (await send(agent, revision, contactIds)).messages;
  const { delivery, taken } = await office();
  const job = { firmId: estimator.firmId, messageId: message!.id };
  await delivery.deliver(job);
  const waiting = revisionSchema.parse((await agent.get(`/api/revisions/${revision.id}`)).body).messages[0]!;
  expect(waiting).toMatchObject({ state: 'waiting', attempts: 0, answer: 'Waits for the PDF, which is being made.' });
  const before = await queued(stack, 'messageId', message!.id);
  await render(stack, estimator, revision);
  expect(await queued(stack, 'messageId', message!.id)).toBe(before + 1);
  await delivery.deliver(job);
  expect(taken).toHaveLength(1);
});

it('tells when a contact has the revision already, and sends it again only deliberately', async () => {
  const { agent, estimator, path, contactIds } = await newDesk(stack, 2);
  const revision = await freeze({ agent, path });
  await render(stack, estimator, revision);
  const url = `/api/revisions/${revision.id}/messages`;
  const both = await Promise.all([1, 2].map(() => agent.post(url).send({ ...words, contactIds })));
  expect(both.map(({ status }) => status).sort()).toEqual([202, 409]);
  const refused = await agent
    .post(url)
    .send({ ...words, contactIds: contactIds.slice(0, 1) })
    .expect(409);
  expect(refused.body.detail).toContain('Clara Client 0 has Revision A already');
  const again = await agent
    .post(url)
    .send({ ...words, contactIds: contactIds.slice(0, 1), again: true })
    .expect(202);
  expect(revisionSchema.parse(again.body).messages).toHaveLength(3);
});

it('writes no message and queues nothing when one of the recipients is not the job’s', async () => {
  const { agent, path, contactIds } = await newDesk(stack);
  const { contactIds: strangers } = await newDesk(stack);
  const revision = await freeze({ agent, path });
  const url = `/api/revisions/${revision.id}/messages`;
  const answer = await agent
    .post(url)
    .send({ ...words, contactIds: [...contactIds, ...strangers] })
    .expect(400);
  expect(answer.body.fields).toEqual({ 'contactIds.1': 'Not known here' });
  expect((await agent.get(`/api/revisions/${revision.id}`)).body.messages).toEqual([]);
  await agent
    .post(url)
    .send({ ...words, subject: 'a\r\nBcc: x@y.example', contactIds })
    .expect(400);
  await agent
    .post(url)
    .send({ ...words, subject: '', contactIds: [] })
    .expect(400);
});

it('previews the mail as it goes out, but for each recipient’s own link', async () => {
  const { agent, message, sendJob, revision, contactIds } = await newMessage(stack);
  const preview = await agent
    .post(`/api/revisions/${revision.id}/mail-preview`)
    .send({ ...words, contactIds })
    .expect(200);
  const { delivery, taken } = await office();
  await delivery.deliver(sendJob);
  const mail = await simpleParser(taken[0]!.bytes);
  const withoutLink = (text = '') => text.replace(/links\/[\w…-]+/g, 'links/').trim();
  expect(withoutLink(preview.body.text)).toBe(withoutLink(mail.text));
  expect(withoutLink(preview.body.html)).toBe(withoutLink(mail.html || ''));
  expect(preview.body.subject).toBe(message.subject);
});

it('calls a claim that was never answered perhaps sent, and no sooner than its lease ends', async () => {
  const { sendJob, now, message } = await newMessage(stack);
  await stack
    .owner('messages')
    .where({ id: message.id })
    .update({ state: 'sending', attempts: 1, claimed_at: new Date() });
  const { smtp, taken } = await office();
  await deliveryWith(stack, smtp).deliver(sendJob);
  expect(await now()).toMatchObject({ state: 'sending' });
  const later = new Date(Date.now() + 181_000);
  await deliveryWith(stack, smtp, { clock: () => later }).deliver(sendJob);
  expect(await now()).toMatchObject({ state: 'perhaps-sent' });
  expect(taken).toHaveLength(0);
});
