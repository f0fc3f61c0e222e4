// The inbox's pages: plain HTML, nothing that runs.

const signs = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
export const escape = (text) => String(text ?? '').replace(/[&<>"']/g, (sign) => signs[sign]);

const page = (title, body) => `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escape(title)} · Inbox</title>
<link rel="stylesheet" href="/style.css">
<link rel="icon" href="data:,">
</head>
<body><main>${body}</main></body>
</html>`;

const when = (date) => escape(date ? date.toISOString().replace('T', ' ').slice(0, 16) + ' UTC' : '');
const people = (field) =>
  escape(
    [field ?? []]
      .flat()
      .map(({ text }) => text)
      .join(', '),
  );

export function listPage(messages) {
  const row = ({
    id,
    mail,
  }) => `<li><a href="/messages/${escape(id)}">${escape(mail.subject ?? 'Without a subject')}</a>
<span>to ${people(mail.to)}</span><span>${when(mail.date)}</span></li>`;
  const list =
    messages.length > 0
      ? `<ul class="list">${messages.map(row).join('\n')}</ul>`
      : '<p>Nothing yet. What Thickset sends on this machine arrives here and goes no further.</p>';
  return page('Mail', `<h1>Inbox</h1>${list}`);
}

const linked = (text) =>
  escape(text).replace(
    /https?:\/\/[^\s<]+?(?=[.,;:)]*(\s|$))/g,
    (address) => `<a href="${address}" rel="noreferrer">${address}</a>`,
  );

export function messagePage({ id, mail }) {
  const base = `/messages/${escape(id)}`;
  const attached = ({ filename, size, contentType }, index) =>
    `<li><a href="${base}/attachments/${index}" download>${escape(filename ?? 'Without a name')}</a> ${escape(contentType)}, ${Math.ceil(size / 1024)} kB</li>`;
  const files =
    mail.attachments.length > 0 ? `<h2>Attachments</h2><ul>${mail.attachments.map(attached).join('')}</ul>` : '';
  const html = mail.html
    ? `<h2>As HTML</h2><iframe title="Message as HTML" sandbox="allow-popups allow-popups-to-escape-sandbox" src="${base}/html"></iframe>`
    : '';
  const heads = [
    ['From', people(mail.from)],
    ['To', people(mail.to)],
    ['Copy to', people(mail.cc)],
    ['Reply to', people(mail.replyTo)],
    ['When', when(mail.date)],
    ['Message-ID', escape(mail.messageId)],
  ].filter(([, value]) => value !== '');
  return page(
    mail.subject ?? 'Message',
    `<p><a href="/">Inbox</a></p><h1>${escape(mail.subject ?? 'Without a subject')}</h1>
<dl>${heads.map(([name, value]) => `<dt>${name}</dt><dd>${value}</dd>`).join('')}</dl>
${files}<h2>As text</h2><pre>${linked(mail.text ?? '')}</pre>${html}
<p><a href="${base}/source" download>The message as it came</a></p>`,
  );
}

export const missingPage = () => page('Not here', '<h1>Not here</h1><p><a href="/">Inbox</a></p>');

export const style = `
:root { color-scheme: light dark; font: 17px/1.5 system-ui, sans-serif; }
body { margin: 0; background: light-dark(#f6f3ec, #11161b); color: light-dark(#1b242d, #eef1f3); }
main { max-width: 60rem; margin: 0 auto; padding: 1rem; }
h1 { font-size: 1.65rem; } h2 { font-size: 1.1rem; }
a { color: light-dark(#9e3a1c, #e58a66); }
.list { list-style: none; padding: 0; }
.list li { display: flex; flex-wrap: wrap; gap: 0 1rem; padding: .6rem 0; border-bottom: 1px solid light-dark(#d8d2c6, #2e3740); }
.list a { flex: 1 1 100%; }
dl { display: grid; grid-template-columns: max-content 1fr; gap: 0 1rem; } dd { margin: 0; overflow-wrap: anywhere; }
pre { white-space: pre-wrap; overflow-wrap: anywhere; font: 0.9rem/1.5 ui-monospace, monospace; padding: 1rem; background: light-dark(#fff, #1a2128); }
iframe { width: 100%; height: 36rem; border: 1px solid light-dark(#d8d2c6, #2e3740); background: #fff; }
`;
