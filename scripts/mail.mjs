// npm run mail: the local SMTP server and its inbox, alone. npm start runs it too: node scripts/mail.mjs SMTP-PORT INBOX-PORT
import path from 'node:path';

import { createInbox } from './mail/inbox.mjs';
import { openMaildir } from './mail/maildir.mjs';
import { createSmtpServer } from './mail/smtp.mjs';
import { choosePort, openState } from './state.mjs';

const listen = (server, port) =>
  new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', resolve);
  });

async function main([givenSmtp, givenInbox]) {
  const folder = path.join(openState(), 'mail');
  const [smtpPort, inboxPort] = [
    givenSmtp ?? (await choosePort('smtp')),
    givenInbox ?? (await choosePort('inbox')),
  ].map(Number);
  const maildir = await openMaildir(folder);
  const smtp = createSmtpServer(maildir);
  smtp.on('error', () => {}); // a client that hangs up
  const inbox = createInbox(maildir);
  await Promise.all([listen(smtp.server, smtpPort), listen(inbox, inboxPort)]);
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP', 'disconnect']) process.once(signal, () => process.exit(0));
  process.send?.('ready');
  if (!process.send)
    console.log(
      `SMTP server  smtp://127.0.0.1:${smtpPort}\nInbox        http://localhost:${inboxPort}\nMaildir      ${folder}`,
    );
}

main(process.argv.slice(2)).catch((error) => {
  console.error(`The mail server does not start: ${error.message}`);
  process.exit(1);
});
