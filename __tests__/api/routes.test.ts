import request from 'supertest';

import { mayDo, permissions, type Permission } from '@/api/contracts/permission';
import type { Member } from '@/api/contracts/session';

import { newFirm, newMember, signedIn } from '../support/firm';
import type { Agent } from '../support/job';
import { isWrite, routesOf, type Route } from '../support/routes';
import { startStack, type Stack } from '../support/stack';
import { newWorld, pathIn, type World } from '../support/world';

/** Whoever opens a route to everyone says so here too. */
const opened = ['GET /health', 'GET /ready', 'POST /session', 'GET /links/:token', 'GET /links/:token/pdf'];

let stack: Stack;
let routes: Route[];
let ruled: (Route & { permission: Permission })[];
let world: World;
let people: { member: Member; agent: Agent }[];
beforeAll(async () => {
  stack = await startStack();
  routes = routesOf(stack.app);
  ruled = routes.flatMap((route) => {
    const permission = permissions.find(
      (name) => route.rule && 'permission' in route.rule && route.rule.permission === name,
    );
    return permission ? [{ ...route, permission }] : [];
  });
  const owner = await newFirm(stack.services);
  const members = [
    owner,
    await newMember(stack.services, owner, { role: 'estimator', maySend: true, seesMargin: true }),
    await newMember(stack.services, owner, { role: 'estimator' }),
    await newMember(stack.services, owner, { role: 'foreman' }),
  ];
  people = await Promise.all(members.map(async (member) => ({ member, agent: await signedIn(stack, member) })));
  world = await newWorld(await signedIn(stack, owner), stack.services);
});
afterAll(() => stack.stop());

type Asking = { agent: Agent; path?: string };
/** A request as the route wants it: this world's ids unless another path is given, a valid body, a version in the query. */
async function ask(
  { method, name, path }: Route,
  { agent, path: given = pathIn(world, path) }: Asking,
): Promise<string> {
  const url = `/api${given}?version=1`;
  const body = world.bodies[name] ?? {};
  const requests: Record<string, () => request.Test> = {
    get: () => agent.get(url),
    post: () => agent.post(url).send(body),
    put: () => agent.put(url).send(body),
    patch: () => agent.patch(url).send(body),
    delete: () => agent.delete(url),
  };
  const answer = await requests[method]?.();
  return `${answer?.status} ${answer?.body?.type ?? ''}`.trim();
}

/** Asks every one of the routes and gives those that answered otherwise, with what they said. */
async function otherwise(some: Route[], expected: string, asking: (route: Route) => Asking): Promise<string[]> {
  const wrong: string[] = [];
  for (const route of some) {
    const answer = await ask(route, asking(route));
    if (answer !== expected) wrong.push(`${route.name}: ${answer}`);
  }
  return wrong;
}

const anybody = () => request.agent(stack.app).set('X-Thickset', '1');

it('knows a rule for every route', () => {
  expect(routes.length).toBeGreaterThan(20);
  expect(routes.filter(({ rule }) => !rule).map(({ name }) => name)).toEqual([]);
  const open = routes.filter(({ rule }) => rule && 'open' in rule).map(({ name }) => name);
  expect(open.sort()).toEqual(opened.sort());
  expect(ruled.length + open.length).toBe(routes.length);
});

it('asks who is signed out to sign in, on every route that is not open', async () => {
  expect(await otherwise(ruled, '401 /problems/sign-in', () => ({ agent: anybody() }))).toEqual([]);
});

it.each([
  ['without the header', {}],
  ['from another origin', { 'X-Thickset': '1', Origin: 'https://elsewhere.example' }],
  ['from an origin that is hidden', { 'X-Thickset': '1', Origin: 'null' }],
  ['that the browser calls cross-site', { 'X-Thickset': '1', 'Sec-Fetch-Site': 'cross-site' }],
  ['of a neighbour below the same domain', { 'X-Thickset': '1', 'Sec-Fetch-Site': 'same-site' }],
])('refuses every write %s, open or not', async (_case, headers) => {
  const writes = routes.filter(isWrite);
  const agent = request.agent(stack.app).set(headers);
  expect(await otherwise(writes, '403 /problems/cross-site', () => ({ agent }))).toEqual([]);
});

it('takes a write from its own origin', async () => {
  const { member } = people[0]!;
  const agent = await signedIn(stack, member);
  const own = { Origin: 'http://localhost:4000', 'Sec-Fetch-Site': 'same-origin' };
  await agent.patch('/api/session').set(own).send({ units: 'SI' }).expect(200);
});

it('refuses everyone what their role does not allow', async () => {
  for (const { member, agent } of people) {
    const forbidden = ruled.filter(({ permission }) => !mayDo(member, permission));
    expect(await otherwise(forbidden, '403 /problems/not-allowed', () => ({ agent }))).toEqual([]);
  }
});

it('lets everyone read what their role allows', async () => {
  for (const { member, agent } of people) {
    const readable = ruled.filter((route) => !isWrite(route) && mayDo(member, route.permission));
    expect(readable.length).toBeGreaterThan(5);
    expect(await otherwise(readable, '200', () => ({ agent }))).toEqual([]);
  }
});

it('has nothing for another firm, whoever asks and whatever id they know', async () => {
  const agent = await signedIn(stack, await newFirm(stack.services));
  const named = ruled.filter(({ path }) => path.includes(':'));
  expect(named.length).toBeGreaterThan(10);
  expect(await otherwise(named, '404 /problems/not-found', () => ({ agent }))).toEqual([]);
});

it.each(['00000000-0000-4000-8000-000000000000', 'not-an-id', '%27%20or%201=1', '1e9'])(
  'has nothing under %s',
  async (id) => {
    const { agent } = people[0]!;
    const named = ruled.filter(({ path }) => path.includes(':'));
    const unknown = ({ path }: Route) => ({ agent, path: path.replace(/:\w+/g, id) });
    expect(await otherwise(named, '404 /problems/not-found', unknown)).toEqual([]);
  },
);
