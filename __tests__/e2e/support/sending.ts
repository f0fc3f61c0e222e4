import { expect, type APIRequestContext } from '@playwright/test';

import { contactSchema, type Contact } from '@/api/contracts/contact';
import { jobSchema } from '@/api/contracts/job';
import { revisionSchema, type MessageState, type Revision } from '@/api/contracts/revision';

import { ask, write } from './api';
import { copyOfDemo, type TestJob } from './jobs';

/** A revision of a job of the test's own, with its PDF, frozen by request. */
export async function frozenJob(request: APIRequestContext, numbers: readonly string[] = ['R30', 'R32', 'D01']) {
  const job = await copyOfDemo(request, numbers);
  return { ...job, revision: await freezeJob(request, job) };
}

export async function freezeJob(request: APIRequestContext, { path }: TestJob): Promise<Revision> {
  const frozen = await write(request, { path: `${path}/revisions`, body: {}, schema: revisionSchema });
  const rendering = async () => (await ask(request, `/revisions/${frozen.id}`, revisionSchema)).rendering;
  await expect.poll(rendering, { message: 'The worker makes the PDF', timeout: 60_000 }).toBe('ready');
  return frozen;
}

/** A contact of the job's own beside those of the demo; the local mail server refuses addresses that begin with "refuse". */
export async function newContact(request: APIRequestContext, { job, path }: TestJob, email: string): Promise<Contact> {
  const body = { name: `Clara Client ${crypto.randomUUID().slice(0, 8)}`, company: '', email, role: '' };
  const contact = await write(request, { path: '/contacts', body, schema: contactSchema });
  const { id: _id, ...input } = await ask(request, path, jobSchema);
  const change = { ...input, contactIds: [...job.contactIds, contact.id] };
  await write(request, { method: 'PATCH', path, body: change, schema: jobSchema });
  return contact;
}

type Sent = { revision: Revision; contact: Contact; subject: string; until: MessageState };

/** Sends a revision by request and waits until its message is in this state. */
export async function send(request: APIRequestContext, { revision, contact, subject, until }: Sent): Promise<Revision> {
  const path = `/revisions/${revision.id}`;
  const body = { contactIds: [contact.id], subject, words: 'Attached is our takeoff.' };
  await write(request, { path: `${path}/messages`, body, schema: revisionSchema });
  const state = async () => (await ask(request, path, revisionSchema)).messages[0]?.state;
  await expect.poll(state, { message: `The message is ${until}`, timeout: 60_000 }).toBe(until);
  return ask(request, path, revisionSchema);
}
