import { contactSchema } from '@/api/contracts/contact';
import { messageSchema, revisionSchema, type Message, type Revision } from '@/api/contracts/revision';
import type { Member } from '@/api/contracts/session';
import type { Smtp } from '@/api/adapters/smtp';
import { createDeliveryService, type Patience } from '@/api/services/delivery-service';
import { createWithFirm } from '@/db/with-firm';

import { newFirm, newMember, signedIn } from './firm';
import { newJob, post, type Agent } from './job';
import { contactInput, jobInput, runInput, specificationInput } from './job-inputs';
import { publicUrl, type Stack } from './stack';

export const words = {
  subject: 'Boiler house: takeoff',
  words: 'Dear Clara,\n\nplease find our takeoff.\n\nKind regards',
};
export const settings = { publicUrl, mailFrom: 'Thickset <thickset@localhost>' };

/** An estimator who may send, with a job that has a run and so many contacts. */
export async function newDesk(stack: Stack, contacts = 1) {
  const owner = await newFirm(stack.services);
  const estimator = await newMember(stack.services, owner, { role: 'estimator', maySend: true });
  const agent = await signedIn(stack, estimator);
  const { job, path, where, service } = await newJob(agent);
  await agent.post(`${path}/specification`).send(specificationInput(service.id)).expect(201);
  const contactIds: string[] = [];
  for (let index = 0; index < contacts; index += 1) {
    const input = { ...contactInput, name: `Clara Client ${index}`, email: `clara-${index}@client.example` };
    contactIds.push((await post(agent, '/api/contacts', { schema: contactSchema, input })).id);
  }
  await agent
    .patch(path)
    .send({ ...jobInput, contactIds, version: job.version })
    .expect(200);
  const run = { ...runInput(where), id: crypto.randomUUID(), version: null };
  await agent
    .patch(`${path}/runs`)
    .send({ put: [run], drop: [] })
    .expect(200);
  return { agent, estimator, owner, job, path, where, contactIds };
}
export type Desk = Awaited<ReturnType<typeof newDesk>>;

export async function freeze({ agent, path }: Pick<Desk, 'agent' | 'path'>): Promise<Revision> {
  return revisionSchema.parse((await agent.post(`${path}/revisions`).send({}).expect(201)).body);
}
export const render = (stack: Stack, { firmId }: Member, { id }: Revision) =>
  stack.services.rendering.render({ firmId, revisionId: id });

export async function send(agent: Agent, { id }: Revision, contactIds: string[]): Promise<Revision> {
  const answer = await agent
    .post(`/api/revisions/${id}/messages`)
    .send({ ...words, contactIds })
    .expect(202);
  return revisionSchema.parse(answer.body);
}
export async function messageNow(agent: Agent, { revisionId, id }: Message): Promise<Message> {
  const revision = revisionSchema.parse((await agent.get(`/api/revisions/${revisionId}`).expect(200)).body);
  return revision.messages.find((message) => message.id === id)!;
}
export async function settle(agent: Agent, { id, version }: Message, as: string): Promise<Message> {
  return messageSchema.parse((await agent.post(`/api/messages/${id}/settle`).send({ as, version }).expect(200)).body);
}

const hasty: Patience = { lease: 180, backOff: () => 1, attempts: 3 };
/** The worker's own service, so that a test decides when a job is taken and what the clock says. */
export function deliveryWith(stack: Stack, smtp: Smtp, { patience = hasty, clock = () => new Date() } = {}) {
  const withFirm = createWithFirm({ db: stack.db, boss: stack.boss });
  return createDeliveryService({ withFirm, clock, smtp, settings, patience });
}

/** A frozen, rendered revision of a new job with a message to its contact that waits. */
export async function newMessage(stack: Stack) {
  const desk = await newDesk(stack);
  const revision = await freeze(desk);
  await render(stack, desk.estimator, revision);
  const sent = await send(desk.agent, revision, desk.contactIds);
  const message = sent.messages[0]!;
  const job = { firmId: desk.estimator.firmId, messageId: message.id };
  return { ...desk, revision: sent, message, sendJob: job, now: () => messageNow(desk.agent, message) };
}

/** What is stored of a message's bytes, as the database's owner sees it. */
export async function storedBytes({ owner }: Stack, { id }: Message): Promise<Buffer> {
  const row: { mime: Buffer } = await owner('messages').where({ id }).select('mime').first();
  return row.mime;
}
export async function queued({ owner }: Stack, key: string, id: string): Promise<number> {
  const { rows } = await owner.raw<{ rows: { count: number }[] }>(
    "select count(*) from pgboss.job where data ->> ? = ? and state in ('created', 'retry')",
    [key, id],
  );
  return rows[0]?.count ?? 0;
}
