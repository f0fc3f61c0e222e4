import SMTPConnection from 'nodemailer/lib/smtp-connection';
import { Readable } from 'node:stream';
import { z } from 'zod';

export type SmtpServer = { host: string; port: number; secure: boolean; user?: string; password?: string };
export type Envelope = { from: string; to: string };
/**
 * What came of handing a mail over, with the server's own words.
 * `later`: nothing was taken, try again; `refused`: nothing was taken, and never will be;
 * `unknown`: the mail was on its way when the connection was lost, so it may have been taken.
 */
export type Delivery = { kind: 'taken' | 'later' | 'refused' | 'unknown'; answer: string };
export type Smtp = { deliver: (envelope: Envelope, bytes: Buffer) => Promise<Delivery> };

type Patience = { connect: number; idle: number; whole: number };
const patience: Patience = { connect: 15_000, idle: 60_000, whole: 100_000 };

/** One connection for each mail: it never throws, it says what came of it. */
export function createSmtp(server: SmtpServer | undefined, limits: Partial<Patience> = {}): Smtp {
  if (!server) return { deliver: async () => ({ kind: 'later', answer: 'No mail server is configured (SMTP_URL).' }) };
  return { deliver: (envelope, bytes) => deliver({ server, limits: { ...patience, ...limits } }, envelope, bytes) };
}

type Way = { server: SmtpServer; limits: Patience };

function deliver(way: Way, envelope: Envelope, bytes: Buffer): Promise<Delivery> {
  const connection = open(way);
  const body = watched(bytes);
  return new Promise((resolve) => {
    let done = false;
    const end = (delivery: Delivery) => {
      if (done) return;
      done = true;
      clearTimeout(deadline);
      if (delivery.kind === 'taken') connection.quit();
      else connection.close();
      resolve(delivery);
    };
    const fail = (error: unknown) => end(failure(error, body.hasStarted()));
    const deadline = setTimeout(() => fail(new Error('The mail server took too long.')), way.limits.whole);
    connection.on('error', fail);
    connection.once('end', () => fail(new Error('The mail server closed the connection.')));
    const send = () =>
      connection.send({ from: envelope.from, to: [envelope.to], size: bytes.length }, body.stream, (error, info) =>
        error ? fail(error) : end({ kind: 'taken', answer: info?.response ?? '' }),
      );
    connection.connect(() => signIn(connection, way.server, { fail, then: send }));
  });
}

function open({ server, limits }: Way): SMTPConnection {
  const { host, port, secure, user } = server;
  return new SMTPConnection({
    host,
    port,
    secure,
    // a password goes over the network only when nobody can read along
    requireTLS: !secure && user !== undefined && !isLoopback(host),
    connectionTimeout: limits.connect,
    greetingTimeout: limits.connect,
    socketTimeout: limits.idle,
  });
}
const isLoopback = (host: string) => /^(localhost|::1|127(\.\d{1,3}){3})$/.test(host);

type Next = { fail: (error: unknown) => void; then: () => void };
function signIn(connection: SMTPConnection, { user, password }: SmtpServer, { fail, then }: Next): void {
  if (user === undefined) return then();
  connection.login({ credentials: { user, pass: password ?? '' } }, (error) => (error ? fail(error) : then()));
}

/** The body, and whether the server asked for any of it: before that nothing can have been taken. */
function watched(bytes: Buffer) {
  let started = false;
  const stream = new Readable({
    read() {
      started = true;
      this.push(bytes);
      this.push(null);
    },
  });
  return { stream, hasStarted: () => started };
}

const smtpError = z.object({
  message: z.string(),
  response: z.string().optional(),
  responseCode: z.number().optional(),
  command: z.string().optional(),
  code: z.string().optional(),
});

const unnamed = (error: unknown): z.infer<typeof smtpError> => ({ message: String(error) });

/** Sorts a failure by what is certain; only an answer to the mail itself, or to its addresses, is the last word. */
function failure(error: unknown, bodyStarted: boolean): Delivery {
  const parsed = smtpError.safeParse(error);
  const known = parsed.success ? parsed.data : unnamed(error);
  const { message, response, responseCode, command = '', code } = known;
  const answer = response ?? message;
  const answered = responseCode !== undefined && ['MAIL FROM', 'RCPT TO', 'DATA'].includes(command);
  if (bodyStarted && !answered) return { kind: 'unknown', answer };
  // larger than the server says it takes: no try will change that
  if ((answered && responseCode >= 500) || code === 'EMESSAGE') return { kind: 'refused', answer };
  return { kind: 'later', answer };
}
