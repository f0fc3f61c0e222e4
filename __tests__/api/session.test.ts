import request from 'supertest';

import { newFirm, newMember, password, signedIn } from '../support/firm';
import { startStack, type Stack } from '../support/stack';

let now = new Date();
let stack: Stack;
beforeAll(async () => {
  stack = await startStack({ clock: () => now });
});
afterAll(() => stack.stop());
beforeEach(() => {
  now = new Date();
});

const signIn = (body: object) => request(stack.app).post('/api/session').set('X-Thickset', '1').send(body);
const milliseconds = async (work: () => PromiseLike<unknown>) => {
  const began = performance.now();
  await work();
  return performance.now() - began;
};

describe('signing in', () => {
  it('answers 401 as problem+json to whoever is signed out', async () => {
    const answer = await request(stack.app)
      .get('/api/session')
      .expect(401)
      .expect('content-type', /problem\+json/);
    expect(answer.body).toEqual({ type: '/problems/sign-in', title: 'Sign in first', status: 401 });
  });

  it('knows the person and the firm, whatever the case of the address', async () => {
    const owner = await newFirm(stack.services);
    const agent = await signedIn(stack, { email: owner.email.toUpperCase() });
    const { body } = await agent.get('/api/session').expect(200);
    const { firmId, ...member } = owner;
    const firm = { name: 'Test firm', town: 'Testerton', currency: 'EUR', locale: 'en-IE', paper: 'A4' };
    expect(body).toEqual({ member, firm: { id: firmId, ...firm, timeZone: 'Europe/Dublin' } });
  });

  it('gives a cookie that scripts cannot read and other sites do not send, under a new id each time', async () => {
    const owner = await newFirm(stack.services);
    const cookieOf = async (agent: ReturnType<typeof request.agent>) => {
      const answer = await agent.post('/api/session').send({ email: owner.email, password }).expect(204);
      return String(answer.headers['set-cookie']);
    };
    const agent = request.agent(stack.app).set('X-Thickset', '1');
    const [first, second] = [await cookieOf(agent), await cookieOf(agent)];
    expect(first).toMatch(/^thickset=.+HttpOnly; SameSite=Lax$/);
    expect(second.split(';')[0]).not.toBe(first.split(';')[0]);
    // the id from before the second sign-in opens nothing any more
    await request(stack.app)
      .get('/api/session')
      .set('Cookie', String(first.split(';')[0]))
      .expect(401);
    await agent.get('/api/session').expect(200);
  });

  it('puts the end of a session off at each use, in the cookie and in the database', async () => {
    const agent = await signedIn(stack, await newFirm(stack.services));
    const { headers } = await agent.get('/api/session').expect(200);
    const ends = /Expires=([^;]+)/.exec(String(headers['set-cookie']))?.[1] ?? '';
    expect(Date.parse(ends) - Date.now()).toBeGreaterThan(13.9 * 86_400_000);
  });

  it('ends with sign-out, for a copy of the cookie too', async () => {
    const agent = await signedIn(stack, await newFirm(stack.services));
    const { headers } = await agent.get('/api/session').expect(200);
    const copy = String(headers['set-cookie']).split(';')[0] ?? '';
    await agent.delete('/api/session').expect(204);
    await agent.get('/api/session').expect(401);
    await request(stack.app).get('/api/session').set('Cookie', copy).expect(401);
  });

  it('forgets a person whom the firm no longer has, and a right that was taken, at the next request', async () => {
    const owner = await newFirm(stack.services);
    const estimator = await newMember(stack.services, owner, { role: 'estimator', maySend: true });
    const agent = await signedIn(stack, estimator);
    const change = (sql: string) => stack.owner.raw(sql, [estimator.accountId]);
    await change('update memberships set may_send = false where account_id = ?');
    expect((await agent.get('/api/session').expect(200)).body.member.maySend).toBe(false);
    await change('delete from memberships where account_id = ?');
    await agent.get('/api/session').expect(401);
  });
});

describe('a wrong password and an unknown address', () => {
  it('get the same answer', async () => {
    const owner = await newFirm(stack.services);
    const wrong = await signIn({ email: owner.email, password: 'not this one' }).expect(401);
    const unknown = await signIn({ email: 'nobody@nowhere.example', password: 'not this one' }).expect(401);
    expect(unknown.body).toEqual(wrong.body);
    expect(wrong.body.type).toBe('/problems/wrong-password');
  });

  it('take the same time, within a factor of two', async () => {
    // a cost at which the comparison outweighs everything else
    const slow = await startStack({ bcryptCost: 10 });
    const owner = await newFirm(slow.services);
    const timed = (email: string) =>
      milliseconds(() => slow.services.session.signIn({ email, password: 'not this one' }).catch(() => undefined));
    const times = { known: [0], unknown: [0] };
    await timed('warm-up@nowhere.example');
    for (let round = 0; round < 5; round += 1) {
      times.known.push(await timed(owner.email));
      times.unknown.push(await timed(`nobody-${round}@nowhere.example`));
    }
    await slow.stop();
    const median = (list: number[]) => list.slice(1).sort((a, b) => a - b)[2] ?? 0;
    const ratio = median(times.unknown) / median(times.known);
    expect(ratio).toBeGreaterThan(0.5);
    expect(ratio).toBeLessThan(2);
  });
});

describe('limits', () => {
  it('stop an address after ten wrong passwords, right one included, say how long, and let go afterwards', async () => {
    const { email } = await newFirm(stack.services);
    for (let round = 0; round < 10; round += 1) await signIn({ email, password: 'wrong' }).expect(401);
    const refused = await signIn({ email: email.toUpperCase(), password }).expect(429);
    expect(refused.body).toMatchObject({
      type: '/problems/too-many-tries',
      detail: 'Too many tries with this address. Try again in 15 minutes.',
    });
    const { retryAfter } = refused.body;
    expect(retryAfter).toBeGreaterThan(890);
    expect(refused.headers['retry-after']).toBe(String(retryAfter));
    now = new Date(now.getTime() + (retryAfter + 1) * 1000);
    await signIn({ email, password }).expect(204);
  });

  it('are the same for an address that nobody has', async () => {
    const email = `${Date.now()}@nowhere.example`;
    for (let round = 0; round < 10; round += 1) await signIn({ email, password: 'wrong' }).expect(401);
    await signIn({ email, password: 'wrong' }).expect(429);
  });

  it('are shared by two servers', async () => {
    const other = await startStack({ clock: () => now });
    const { email } = await newFirm(stack.services);
    for (let round = 0; round < 10; round += 1) {
      const { app } = round % 2 ? stack : other;
      await request(app).post('/api/session').set('X-Thickset', '1').send({ email, password: 'wrong' }).expect(401);
    }
    await signIn({ email, password }).expect(429);
    await other.stop();
  });

  it('start anew after a sign-in', async () => {
    const { email } = await newFirm(stack.services);
    for (let round = 0; round < 12; round += 1) {
      await signIn({ email, password: round % 2 ? password : 'wrong' }).expect(round % 2 ? 204 : 401);
    }
  });

  it('stop a network after so many failures, whichever addresses it tries; what succeeds does not count', async () => {
    const strict = await startStack({ signInLimit: { tries: 3, minutes: 15 } });
    const from = (email: string, given: string) =>
      request(strict.app).post('/api/session').set('X-Thickset', '1').send({ email, password: given });
    const { email } = await newFirm(strict.services);
    for (let round = 0; round < 4; round += 1) await from(email, password).expect(204);
    for (let round = 0; round < 3; round += 1) await from(`${round}@nowhere.example`, 'wrong').expect(401);
    const refused = await from(email, password).expect(429);
    expect(refused.body.detail).toBe('Too many tries from your network. Try again in 15 minutes.');
    expect(refused.headers['retry-after']).toBe('900');
    await strict.stop();
  });
});

describe('what is typed', () => {
  it.each([
    [{}, { email: 'Must be text', password: 'Must be text' }],
    [{ email: 'nobody', password: 'x' }, { email: 'Must be an e-mail address' }],
    [
      { email: 7, password: ['x'] },
      { email: 'Must be text', password: 'Must be text' },
    ],
    [{ email: 'a@b.example', password: '' }, { password: 'Must be filled in' }],
    [{ email: 'a@b.example', password: 'ü'.repeat(37) }, { password: 'At most 72 bytes' }],
    [{ email: 'a@b.example', password: 'with\0zero' }, { password: 'Holds a character that cannot be used' }],
  ])('%j gets a message at the field', async (body, fields) => {
    const answer = await signIn(body).expect(400);
    expect(answer.body).toMatchObject({ type: '/problems/invalid-input', fields });
  });

  it('is data, never SQL', async () => {
    await signIn({ email: "x'or'x@nowhere.example", password: "' or 1=1 --" }).expect(401);
  });

  it('changes a person’s own units, and nobody else’s', async () => {
    const owner = await newFirm(stack.services);
    const foreman = await newMember(stack.services, owner, { role: 'foreman' });
    const agent = await signedIn(stack, foreman);
    await agent.patch('/api/session').send({ units: 'furlongs' }).expect(400);
    await agent.patch('/api/session').send({ units: 'IP' }).expect(200);
    expect((await agent.get('/api/session')).body.member.units).toBe('IP');
    const list = await stack.services.member.list(owner);
    expect(list.find(({ accountId }) => accountId === owner.accountId)?.units).toBe('SI');
  });
});
