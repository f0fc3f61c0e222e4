import net from 'node:net';
import { SMTPServer } from 'smtp-server';

import { createSmtp, type Smtp } from '@/api/adapters/smtp';

/** What the mail server does with the next mail; after the list it takes everything. */
export type Answer = 'take' | { at: 'rcpt' | 'data'; code: number; words: string };
export type Taken = { from: string; to: string[]; bytes: Buffer };

const refusal = ({ code, words }: { code: number; words: string }) =>
  Object.assign(new Error(words), { responseCode: code });

/** A real SMTP server on loopback that answers as it is told, and keeps what it took byte for byte. */
export async function openPostOffice(answers: Answer[] = []) {
  const taken: Taken[] = [];
  const next = (at: 'rcpt' | 'data') => {
    const [answer] = answers;
    if (!answer || answer === 'take' || answer.at !== at) return null;
    answers.shift();
    return refusal(answer);
  };
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onRcptTo: (_address, _session, callback) => callback(next('rcpt')),
    onData(stream, { envelope }, callback) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const refused = next('data');
        if (refused) return callback(refused);
        if (answers[0] === 'take') answers.shift();
        const from = envelope.mailFrom ? envelope.mailFrom.address : '';
        taken.push({ from, to: envelope.rcptTo.map(({ address }) => address), bytes: Buffer.concat(chunks) });
        return callback();
      });
    },
  });
  server.on('error', () => undefined);
  const port = await listening(server.server);
  const smtp: Smtp = createSmtp({ host: '127.0.0.1', port, secure: false });
  return { smtp, port, taken, answers, close: () => new Promise<void>((done) => server.close(done)) };
}
export type PostOffice = Awaited<ReturnType<typeof openPostOffice>>;

/** A server that reads a whole mail and hangs up instead of answering; `mails` counts how many it read. */
export async function openHangingUp(when: 'greeting' | 'after-data') {
  let mails = 0;
  const server = net.createServer((socket) => {
    socket.on('error', () => undefined);
    if (when === 'greeting') return socket.destroy();
    let reading = false;
    socket.write('220 ready\r\n');
    socket.on('data', (chunk) => {
      const text = chunk.toString('latin1');
      if (!reading) socket.write(text.startsWith('DATA') ? '354 go on\r\n' : '250 ok\r\n');
      else if (text.endsWith('\r\n.\r\n')) {
        mails += 1;
        socket.destroy();
      }
      reading ||= text.startsWith('DATA');
    });
    return undefined;
  });
  const port = await listening(server);
  const smtp = createSmtp({ host: '127.0.0.1', port, secure: false });
  return { smtp, mails: () => mails, close: () => new Promise((done) => server.close(done)) };
}

/** Nobody listens there. */
export const closedOffice = (): Smtp => createSmtp({ host: '127.0.0.1', port: 9, secure: false });

const listening = (server: net.Server): Promise<number> =>
  new Promise((resolve) => {
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      resolve(address && typeof address === 'object' ? address.port : 0);
    });
  });
