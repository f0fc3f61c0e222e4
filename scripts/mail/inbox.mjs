// A small page on loopback to read the mail that was kept. Plain http.
import http from 'node:http';

import { listPage, messagePage, missingPage, style } from './pages.mjs';

const pagePolicy =
  "default-src 'none'; style-src 'self'; frame-src 'self'; img-src data:; form-action 'none'; frame-ancestors 'self'; base-uri 'none'";
// a message is a stranger's HTML: nothing runs, nothing loads; its links open outside
const mailPolicy =
  "sandbox allow-popups allow-popups-to-escape-sandbox; default-src 'none'; style-src 'unsafe-inline'; img-src data:";

const html = (body, policy = pagePolicy) => ({ type: 'text/html; charset=utf-8', body, policy });
const file = (name, body) => ({ type: 'application/octet-stream', body, policy: "sandbox; default-src 'none'", name });

export function createInbox(maildir) {
  return http.createServer((request, response) => {
    answer(maildir, request).then(
      (found) => send(response, found ?? { ...html(missingPage()), status: 404 }),
      () => send(response, { ...html(missingPage()), status: 500 }),
    );
  });
}

async function answer(maildir, { method, url, headers }) {
  // a page of another name that leads here must not read the mail
  if (method !== 'GET' || !/^(localhost|127\.0\.0\.1)(:\d+)?$/.test(headers.host ?? '')) return undefined;
  const { pathname } = new URL(url, 'http://localhost');
  if (pathname === '/') return html(listPage(await maildir.list()));
  if (pathname === '/style.css') return { type: 'text/css', body: style, policy: pagePolicy };
  const [, id, part, index] =
    /^\/messages\/([\w.-]+)(?:\/(html|source|attachments)(?:\/(\d+))?)?$/.exec(pathname) ?? [];
  const message = id && (await maildir.read(id));
  if (!message) return undefined;
  if (part === 'html') return html(`<base target="_blank">${message.mail.html || ''}`, mailPolicy);
  if (part === 'source') return file(`${id}.eml`, message.bytes);
  if (part === 'attachments') return attachment(message.mail.attachments[Number(index)]);
  return html(messagePage(message));
}

const attachment = (found) => found && file(found.filename ?? 'attachment', found.content);

function send(response, { status = 200, type, body, policy, name }) {
  response.writeHead(status, {
    'Content-Type': type,
    'Content-Security-Policy': policy,
    'X-Content-Type-Options': 'nosniff',
    'Referrer-Policy': 'no-referrer',
    'Cache-Control': 'no-store',
    ...(name && { 'Content-Disposition': `attachment; filename*=UTF-8''${encodeURIComponent(name)}` }),
  });
  response.end(body);
}
