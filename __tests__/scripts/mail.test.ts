import fs from 'node:fs/promises';
import http from 'node:http';
import type { AddressInfo, Server } from 'node:net';
import os from 'node:os';
import path from 'node:path';
import nodemailer, { type Transporter } from 'nodemailer';

import { createInbox } from '@/scripts/mail/inbox.mjs';
import { openMaildir } from '@/scripts/mail/maildir.mjs';
import { createSmtpServer } from '@/scripts/mail/smtp.mjs';

const pdf = Buffer.from('%PDF-1.7 \0\xff not a real one', 'latin1');
const hostile = '<script>alert(1)</script>';
const letter = {
  from: 'Tamsin Orrowby <tamsin@brackwater.example>',
  to: 'Marisel Quonder <marisel@quonder.example>',
  replyTo: 'tamsin@brackwater.example',
  subject: `BLI-0417 Revision A ${hostile}`,
  text: `Open http://localhost:4000/links/abc, please. ${hostile}`,
  html: `<p>Open <a href="http://localhost:4000/links/abc">it</a></p>${hostile}`,
  attachments: [{ filename: 'BLI-0417 "A".pdf', content: pdf, contentType: 'application/pdf' }],
};

let folder: string;
let smtp: ReturnType<typeof createSmtpServer>;
let inbox: Server;
let mailer: Transporter;
beforeAll(async () => {
  folder = await fs.mkdtemp(path.join(os.tmpdir(), 'thickset-mail-'));
  const maildir = await openMaildir(folder);
  smtp = createSmtpServer(maildir);
  inbox = createInbox(maildir);
  await listening(smtp.server);
  await listening(inbox);
  mailer = nodemailer.createTransport({ host: '127.0.0.1', port: portOf(smtp.server), secure: false });
});
afterAll(async () => {
  mailer.close();
  await new Promise<void>((resolve) => smtp.close(() => resolve()));
  await new Promise((resolve) => inbox.close(resolve));
  await fs.rm(folder, { recursive: true });
});

const listening = (server: Server) => new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
function portOf(server: Server): number {
  const address: AddressInfo | string | null = server.address();
  if (address === null || typeof address === 'string') throw new Error('Not listening');
  return address.port;
}
/** fetch may not set Host, so this asks by hand. */
const get = (url: string, headers: http.OutgoingHttpHeaders = {}) =>
  new Promise<{ status?: number; headers: http.IncomingHttpHeaders; bytes: Buffer; text: string }>(
    (resolve, reject) => {
      http
        .get({ host: '127.0.0.1', port: portOf(inbox), path: url, headers }, (answer) => {
          const chunks: Buffer[] = [];
          answer.on('data', (chunk: Buffer) => chunks.push(chunk));
          answer.on('end', () => {
            const bytes = Buffer.concat(chunks);
            resolve({ status: answer.statusCode, headers: answer.headers, bytes, text: bytes.toString() });
          });
        })
        .on('error', reject);
    },
  );
const files = async (part: string) => (await fs.readdir(path.join(folder, part))).sort();

it('says what will come while there is nothing', async () => {
  expect((await get('/')).text).toContain('Nothing yet');
});

describe('a message', () => {
  let id: string;
  beforeAll(async () => {
    const before = await files('new');
    const { response } = await mailer.sendMail(letter);
    expect(response).toMatch(/^250 /);
    const [added] = (await files('new')).filter((name) => !before.includes(name));
    id = added ?? '';
  });

  it('is in the maildir, whole, under its envelope, with nothing left half written', async () => {
    const stored = await fs.readFile(path.join(folder, 'new', id), 'latin1');
    expect(stored).toMatch(/^Return-Path: <tamsin@brackwater\.example>\r\nDelivered-To: marisel@quonder\.example\r\n/);
    expect(await files('tmp')).toEqual([]);
    const source = await get(`/messages/${id}/source`);
    expect(source.bytes.toString('latin1')).toBe(stored);
  });

  it('is listed and shown as text, its tags as words and its link to follow', async () => {
    const list = await get('/');
    expect(list.text).toContain(`href="/messages/${id}"`);
    const { text } = await get(`/messages/${id}`);
    for (const page of [list.text, text]) expect(page).not.toContain(hostile);
    expect(text).toContain('&lt;script&gt;');
    expect(text).toContain('<a href="http://localhost:4000/links/abc" rel="noreferrer">');
    expect(text).toContain('Marisel Quonder');
    expect(text).toMatch(/<iframe [^>]*sandbox="allow-popups allow-popups-to-escape-sandbox"/);
  });

  it('is shown as HTML where nothing runs and nothing loads', async () => {
    const { text, headers } = await get(`/messages/${id}/html`);
    expect(text).toContain('<a href="http://localhost:4000/links/abc">it</a>');
    const policy = String(headers['content-security-policy']);
    expect(policy).toMatch(/^sandbox /);
    expect(policy).not.toContain('allow-scripts');
    expect(policy).toContain("default-src 'none'");
  });

  it('gives its attachment byte for byte, as a download', async () => {
    const { bytes, headers } = await get(`/messages/${id}/attachments/0`);
    expect(bytes.equals(pdf)).toBe(true);
    expect(headers['content-disposition']).toBe("attachment; filename*=UTF-8''BLI-0417%20%22A%22.pdf");
    expect(headers['content-type']).toBe('application/octet-stream');
    expect((await get(`/messages/${id}/attachments/7`)).status).toBe(404);
  });

  it.each(['/messages/nobody', '/messages/..%2f..%2fetc%2fpasswd', '/messages/../../etc/passwd', '/nowhere'])(
    'is all that can be read: not %s',
    async (url) => {
      expect((await get(url)).status).toBe(404);
    },
  );

  it('is not for a page that reaches loopback under another name', async () => {
    expect((await get('/', { Host: 'elsewhere.example' })).status).toBe(404);
    expect((await get('/', { Host: `localhost:${portOf(inbox)}` })).status).toBe(200);
  });
});

it('refuses for good, and for now, in the way of a real server', async () => {
  const before = await files('new');
  await expect(mailer.sendMail({ ...letter, to: 'refuse@quonder.example' })).rejects.toMatchObject({
    responseCode: 550,
    response: '550 No such mailbox here',
  });
  await expect(mailer.sendMail({ ...letter, to: 'busy@quonder.example' })).rejects.toMatchObject({ responseCode: 451 });
  expect(await files('new')).toEqual(before);
});

it('keeps many at once, each under its own name', async () => {
  const before = await files('new');
  await Promise.all(
    Array.from({ length: 20 }, (_, index) => mailer.sendMail({ ...letter, subject: `Number ${index}` })),
  );
  expect(await files('new')).toHaveLength(before.length + 20);
});
