import { fork } from 'node:child_process';
import path from 'node:path';
import { pino } from 'pino';

import { revisionSchema, type Revision } from '@/api/contracts/revision';
import { createSmtp } from '@/api/adapters/smtp';
import { startQueue } from '@/api/queue/queue';
import { workOnRendering } from '@/api/queue/render-worker';
import { workOnSending } from '@/api/queue/send-worker';

import { ownDatabase } from '../support/own-database';
import { openPostOffice } from '../support/post-office';
import { deliveryWith, freeze, newDesk, newMessage, send, type Desk } from '../support/sending';
import { startStack, type Stack } from '../support/stack';

jest.setTimeout(120_000);
const logger = pino({ level: 'silent' });
let database: Awaited<ReturnType<typeof ownDatabase>>;
let stack: Stack;
beforeAll(async () => {
  database = await ownDatabase();
  stack = await startStack({ database });
});
afterAll(async () => {
  await stack.stop();
  await database.drop();
});

/** Server and worker as they run, with short waits between tries. */
async function startWorker(port: number) {
  const boss = await startQueue(database.url, { works: true, logger });
  const smtp = createSmtp({ host: '127.0.0.1', port, secure: false });
  const patience = { lease: 180, backOff: () => 1, attempts: 50 };
  await workOnRendering({ boss, logger, rendering: stack.services.rendering });
  await workOnSending({ boss, logger, delivery: deliveryWith(stack, smtp, { patience }) });
  return { stop: () => boss.stop({ graceful: true, timeout: 10_000 }) };
}

async function until({ agent }: Desk, revision: Revision, reached: (now: Revision) => boolean): Promise<Revision> {
  for (let tries = 0; tries < 300; tries += 1) {
    const now = revisionSchema.parse((await agent.get(`/api/revisions/${revision.id}`).expect(200)).body);
    if (reached(now)) return now;
    await new Promise((done) => setTimeout(done, 200));
  }
  throw new Error('It never came to that');
}

it('renders, waits out a mail server that is down, and sends once', async () => {
  const gone = await openPostOffice();
  const { port } = gone;
  await gone.close();
  const worker = await startWorker(port);
  const desk = await newDesk(stack, 2);
  const revision = await freeze(desk);
  await send(desk.agent, revision, desk.contactIds);
  const down = await until(desk, revision, ({ messages }) => messages.every(({ attempts }) => attempts >= 2));
  expect(down.rendering).toBe('ready');
  expect(down.messages.map(({ state }) => state)).not.toContain('perhaps-sent');

  const office = await openPostOffice([], port);
  const sent = await until(desk, revision, ({ messages }) => messages.every(({ state }) => state === 'sent'));
  await worker.stop();
  expect(sent.messages).toHaveLength(2);
  expect(office.taken.map(({ to }) => to[0]).sort()).toEqual(['clara-0@client.example', 'clara-1@client.example']);
  await office.close();
});

it('lets a running send finish when the worker is stopped', async () => {
  const office = await openPostOffice();
  const worker = await startWorker(office.port);
  const desk = await newDesk(stack);
  const revision = await freeze(desk);
  office.hold();
  await send(desk.agent, revision, desk.contactIds);
  await office.held();
  const stopping = worker.stop();
  office.release();
  await stopping;
  const now = await until(desk, revision, ({ messages }) => messages[0]?.state !== 'sending');
  expect(now.messages[0]).toMatchObject({ state: 'sent', attempts: 1 });
  await office.close();
});

it('never sends again what a killed worker may have sent: it is perhaps sent, and a person settles it', async () => {
  const office = await openPostOffice();
  const { sendJob, now, agent, message } = await newMessage(stack);
  const child = fork(path.join(__dirname, '../support/killed-worker.ts'), {
    execArgv: ['--import', 'tsx'],
    env: {
      ...process.env,
      DATABASE_URL: database.url,
      SMTP_PORT: String(office.port),
      FIRM: sendJob.firmId,
      MESSAGE: sendJob.messageId,
    },
  });
  await new Promise((resolve) => child.once('message', resolve));
  child.kill('SIGKILL');
  await new Promise((resolve) => child.once('exit', resolve));
  expect(office.taken).toHaveLength(1);
  expect(await now()).toMatchObject({ state: 'sending', attempts: 1 });

  const later = new Date(Date.now() + 200_000);
  const next = deliveryWith(stack, office.smtp, { clock: () => later });
  await next.deliver(sendJob);
  await next.deliver(sendJob);
  const unsure = await now();
  expect(unsure).toMatchObject({ state: 'perhaps-sent', attempts: 1 });
  expect(unsure.answer).toContain('never recorded');
  expect(office.taken).toHaveLength(1);
  const body = { as: 'sent', version: unsure.version };
  const settled = await agent.post(`/api/messages/${message.id}/settle`).send(body).expect(200);
  expect(settled.body).toMatchObject({ state: 'sent', attempts: 1 });
  await office.close();
});
