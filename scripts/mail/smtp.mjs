// A real SMTP server that delivers nothing: what it takes goes into a maildir.
import { SMTPServer } from 'smtp-server';

const largest = 40 * 1024 * 1024;

/**
 * Takes any message, with or without a sign-in. To see what a real server may say, an address that begins with
 * `refuse` is refused for good (550) and one that begins with `busy` for now (451).
 */
export function createSmtpServer(maildir) {
  return new SMTPServer({
    banner: 'Thickset, local only',
    authOptional: true,
    onAuth: (_auth, _session, done) => done(null, { user: 'anyone' }),
    disabledCommands: ['STARTTLS'],
    hideSTARTTLS: true,
    allowInsecureAuth: true,
    size: largest,
    onRcptTo: ({ address }, _session, done) => done(refusal(address)),
    onData: (stream, session, done) => {
      const chunks = [];
      stream.on('data', (chunk) => chunks.push(chunk));
      stream.once('end', () => {
        if (stream.sizeExceeded) return done(answer(552, 'Too large for this mailbox'));
        const { mailFrom, rcptTo } = session.envelope;
        const envelope = { from: mailFrom ? mailFrom.address : '', to: rcptTo.map(({ address }) => address) };
        maildir.save(Buffer.concat(chunks), envelope).then(
          (id) => done(null, `Kept as ${id}`),
          () => done(answer(452, 'Cannot be kept at this moment')),
        );
      });
    },
  });
}

function refusal(address) {
  if (address.startsWith('refuse')) return answer(550, 'No such mailbox here');
  if (address.startsWith('busy')) return answer(451, 'Busy, try again later');
  return undefined;
}

const answer = (responseCode, words) => Object.assign(new Error(words), { responseCode });
