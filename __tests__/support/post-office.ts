import net from 'node:net';
import { SMTPServer } from 'smtp-server';

import { createSmtp, type Smtp } from '@/api/adapters/smtp';

/** What the mail server does with the next mail; after the list it takes everything. */
export type Answer = 'take' | { at: 'rcpt' | 'data'; code: number; words: string };
export type Taken = { from: string; to: string[]; bytes: Buffer };

const refusal = ({ code, words }: { code: number; words: string }) =>
  Object.assign(new Error(words), { responseCode: code });

/** A real SMTP server on loopback that answers as it is told, and keeps what it took byte for byte. */
export async function openPostOffice(answers: Answer[] = [], wanted = 0) {
  const pause = createPause();
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
      stream.on('end', async () => {
        await pause.pass();
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
  const port = await listening(server.server, wanted);
  const smtp: Smtp = createSmtp({ host: '127.0.0.1', port, secure: false });
  const close = () => new Promise<void>((done) => server.close(done));
  return { smtp, port, taken, answers, close, hold: pause.hold, held: pause.held, release: pause.release };
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

const listening = (server: net.Server, wanted = 0): Promise<number> =>
  new Promise((resolve) => {
    server.listen(wanted, '127.0.0.1', () => {
      const address = server.address();
      resolve(address && typeof address === 'object' ? address.port : 0);
    });
  });

/** Lets a test stop a mail between its last line and the server's answer. */
function createPause() {
  let gate: Promise<void> | null = null;
  let open = () => {};
  let arrive = () => {};
  const arrived = new Promise<void>((resolve) => (arrive = resolve));
  return {
    hold: () => {
      gate = new Promise((resolve) => (open = resolve));
    },
    pass: async () => {
      if (gate) arrive();
      await gate;
    },
    held: () => arrived,
    release: () => open(),
  };
}
