import { simpleParser } from 'mailparser';

import { composeMime } from '@/api/documents/mail/mime';
import { takeoffMail, type MailInput } from '@/api/documents/mail/takeoff-mail';

import { sampleSnapshot } from '../../support/snapshot';

const input: MailInput = {
  subject: 'Saltern Quay: insulation takeoff, Revision B',
  words: 'Dear Wim,\n\nplease find our takeoff.\nTwo lines, one paragraph.\n\nKind regards',
  snapshot: sampleSnapshot(24),
  sender: { name: 'Nerys Thornquill', email: 'nerys@tidewrack.example' },
  link: 'https://thickset.example/links/token',
  fileName: 'TW-0231-Rev-B-takeoff-2026-03-12.pdf',
};

it('says the same in both forms', () => {
  const { text, html } = takeoffMail(input);
  for (const words of [
    'please find our takeoff.',
    'TW-0231 Revision B',
    'Saltern Quay swimming pool, plant renewal',
    '12 March 2026',
    '26 April 2026',
    input.link,
    input.fileName,
    'This link is yours alone',
    'estimates for steady conditions',
    'Answers go to nerys@tidewrack.example',
    'Tidewrack Insulation',
  ]) {
    expect(text).toContain(words);
    expect(html).toContain(words);
  }
});

it('loads nothing from elsewhere and lets no typed text become markup', () => {
  const hostile = '<script>alert(1)</script><img src=x onerror=y>"\'&';
  const { html, text } = takeoffMail({
    ...input,
    subject: hostile,
    words: hostile,
    sender: { name: hostile, email: input.sender.email },
    snapshot: { ...input.snapshot, job: { ...input.snapshot.job, name: hostile, number: hostile } },
  });
  expect(html).not.toMatch(/<script|<img|<link|<style|@import|url\(/);
  expect(html).toContain('&lt;script&gt;alert(1)&lt;/script&gt;');
  expect(text).toContain(hostile);
  const addresses = [...html.matchAll(/(?:href|src)="([^"]*)"/g)].map(([, address]) => address);
  expect(addresses).toEqual([input.link]);
});

it('lets no name and no subject write a header', async () => {
  const injected = 'Wim\r\nBcc: everybody@elsewhere.example\r\n\r\nbody';
  const bytes = await composeMime({
    from: { name: injected, address: 'records@tidewrack.example' },
    to: { name: injected, address: 'wim@oosterdale.example' },
    replyTo: { name: injected, address: 'nerys@tidewrack.example' },
    mail: { ...takeoffMail(input), subject: injected },
    attachment: { fileName: input.fileName, bytes: Buffer.from('%PDF-') },
    messageId: '<one@tidewrack.example>',
    date: new Date('2026-03-12T15:40:00Z'),
  });
  const mail = await simpleParser(bytes);
  expect(mail.bcc).toBeUndefined();
  expect(mail.to).toMatchObject({ value: [{ address: 'wim@oosterdale.example' }] });
  expect(mail.subject).toContain('Bcc: everybody@elsewhere.example');
  expect(mail.messageId).toBe('<one@tidewrack.example>');
  expect(mail.date?.toISOString()).toBe('2026-03-12T15:40:00.000Z');
  expect(bytes.toString('latin1')).not.toMatch(/[^\r]\n/);
});

it('carries names and words of any script', async () => {
  const bytes = await composeMime({
    from: { name: 'Größe & Söhne', address: 'records@tidewrack.example' },
    to: { name: 'شركة', address: 'wim@oosterdale.example' },
    replyTo: { name: 'Nerys', address: 'nerys@tidewrack.example' },
    mail: takeoffMail({ ...input, subject: 'Dämmung 🏊', words: 'שלום 🏊' }),
    attachment: { fileName: input.fileName, bytes: Buffer.from('%PDF-') },
    messageId: '<two@tidewrack.example>',
    date: new Date(0),
  });
  const mail = await simpleParser(bytes);
  expect(mail.from?.value[0]?.name).toBe('Größe & Söhne');
  expect(mail.subject).toBe('Dämmung 🏊');
  expect(mail.text).toContain('שלום 🏊');
  expect(bytes.every((byte) => byte < 128)).toBe(true);
});
