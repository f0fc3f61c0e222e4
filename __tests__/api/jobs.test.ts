import { newFirm, newMember, signedIn } from '../support/firm';
import { newJob, type Agent } from '../support/job';
import { contactInput, jobInput, runInput } from '../support/job-inputs';
import { startStack, type Stack } from '../support/stack';

let stack: Stack;
let agent: Agent;
let foreman: Agent;
beforeAll(async () => {
  stack = await startStack();
  const owner = await newFirm(stack.services);
  agent = await signedIn(stack, owner);
  foreman = await signedIn(stack, await newMember(stack.services, owner, { role: 'foreman' }));
});
afterAll(() => stack.stop());

describe('contacts', () => {
  it('are made, changed, named by a job in its order, and stay while it names them', async () => {
    const first = (await agent.post('/api/contacts').send(contactInput).expect(201)).body;
    const second = (
      await agent
        .post('/api/contacts')
        .send({ ...contactInput, name: 'Otto Other' })
        .expect(201)
    ).body;
    expect(first).toEqual({ ...contactInput, id: expect.any(String), version: 1 });
    const change = { ...contactInput, email: 'clara.client@client.example', version: 1 };
    const edit = () => agent.patch(`/api/contacts/${first.id}`).send(change);
    const answers = await Promise.all([edit(), edit()]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(answers.find(({ status }) => status === 409)!.body.current).toEqual({ ...change, id: first.id, version: 2 });

    const contactIds = [second.id, first.id];
    const job = (
      await agent
        .post('/api/jobs')
        .send({ ...jobInput, number: 'CON-1', contactIds })
        .expect(201)
    ).body;
    expect(job.contactIds).toEqual(contactIds);
    const { body } = await agent.delete(`/api/contacts/${first.id}?version=2`).expect(409);
    expect(body).toMatchObject({ type: '/problems/conflict', detail: 'Job CON-1 names this contact' });
    const without = { ...jobInput, number: 'CON-1', contactIds: [second.id], version: 1 };
    await agent.patch(`/api/jobs/${job.id}`).send(without).expect(200);
    await agent.delete(`/api/contacts/${first.id}?version=2`).expect(204);
    const { body: contacts } = await foreman.get('/api/contacts').expect(200);
    expect(contacts).toContainEqual(second);
    await foreman.post('/api/contacts').send(contactInput).expect(403);
  });
});

describe('jobs', () => {
  it('come back as typed, with a summary that counts runs and holds', async () => {
    const { job, path, where } = await newJob(agent, { number: 'SUM-1', bidDue: null });
    expect(job).toEqual({ ...jobInput, number: 'SUM-1', bidDue: null, id: job.id, version: 1 });
    const held = { ...runInput(where, 'R02'), status: 'on-hold', hold: { reason: 'Old lagging', by: 'Olive Owner' } };
    const put = [runInput(where), held].map((run) => ({ ...run, id: crypto.randomUUID(), version: null }));
    await agent.patch(`${path}/runs`).send({ put, drop: [] }).expect(200);
    const { body: jobs } = await foreman.get('/api/jobs').expect(200);
    const { number, name, site } = job;
    const summary = { id: job.id, number, name, site, bidDue: null, runs: 2, onHold: 1, lastRevision: null };
    expect(jobs).toContainEqual(summary);
  });

  it('change with their version; a number stands once in a firm, and again in another', async () => {
    const { job, path } = await newJob(agent, { number: 'NUM-1' });
    const change = { ...jobInput, number: 'NUM-2', surfaceMethod: 'iso-12241', version: 1 };
    const edit = () => agent.patch(path).send(change);
    const answers = await Promise.all([edit(), edit()]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(answers.find(({ status }) => status === 409)!.body.current).toEqual({ ...change, id: job.id, version: 2 });
    const { body } = await agent
      .post('/api/jobs')
      .send({ ...jobInput, number: 'NUM-2' })
      .expect(400);
    expect(body.fields).toEqual({ number: 'Another job has this number' });
    const elsewhere = await signedIn(stack, await newFirm(stack.services));
    await elsewhere
      .post('/api/jobs')
      .send({ ...jobInput, number: 'NUM-2' })
      .expect(201);
    await foreman
      .patch(path)
      .send({ ...change, version: 2 })
      .expect(403);
    await foreman
      .post('/api/jobs')
      .send({ ...jobInput, number: 'NUM-3' })
      .expect(403);
  });

  it('take one of two new jobs with the same number', async () => {
    const create = () => agent.post('/api/jobs').send({ ...jobInput, number: 'TWIN' });
    const answers = await Promise.all([create(), create(), create()]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 400, 400]);
  });
});

describe('what was frozen and sent', () => {
  it('shows the last revision in the list, and keeps a contact that something was sent to', async () => {
    const { job } = await newJob(agent, { number: 'REV-1' });
    const contact = (await agent.post('/api/contacts').send(contactInput).expect(201)).body;
    const { firm_id } = await stack.owner('jobs').where({ id: job.id }).first();
    const now = new Date();
    const frozen = { firm_id, job_id: job.id, frozen_at: now, frozen_by: 'Olive Owner', expires_at: now };
    const revision = { ...frozen, valid_until: '2027-01-15', snapshot: '{}', runs: 0, flags: 0 };
    const [first] = await stack
      .owner('revisions')
      .insert(['A', 'B'].map((letter, index) => ({ ...revision, letter, ordinal: index + 1 })))
      .returning('id');
    const people = { to_name: 'C', to_email: 'c@x.example', sender_name: 'O', sender_email: 'o@x.example' };
    const message = { firm_id, revision_id: first.id, contact_id: contact.id, subject: 'S', words: '', asked_at: now };
    await stack.owner('messages').insert({ ...message, ...people });

    const { body: jobs } = await agent.get('/api/jobs').expect(200);
    expect(jobs).toContainEqual(expect.objectContaining({ number: 'REV-1', lastRevision: 'B' }));
    const { body } = await agent.delete(`/api/contacts/${contact.id}?version=1`).expect(409);
    expect(body.detail).toBe('A takeoff was sent to this contact: the record names it');
  });
});
