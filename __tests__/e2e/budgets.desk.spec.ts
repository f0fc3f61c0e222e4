import http from 'node:http';

import type { Page } from '@playwright/test';

import { demoJob } from './support/jobs';
import { open } from './support/open';
import { expect, test } from './support/test';

// A route may add 80 kB to what the sign-in page has loaded: the budgets of the product, in bytes on the wire, gzip.
const budgets = { script: 400_000, font: 150_000, route: 80_000 };
type Kind = 'script' | 'font';

/** The addresses of every script or font that the page loads from here on. */
function loadedBy(page: Page): Record<Kind, Set<string>> {
  const loaded = { script: new Set<string>(), font: new Set<string>() };
  page.on('response', (response) => {
    const kind = response.request().resourceType();
    if (kind === 'script' || kind === 'font') loaded[kind].add(response.url());
  });
  return loaded;
}

/** What crosses the wire for this address to a browser that takes gzip. */
const bytesOf = (address: string) =>
  new Promise<number>((resolve, reject) => {
    http
      .get(address, { headers: { 'accept-encoding': 'gzip' } }, (response) => {
        let bytes = 0;
        response.on('data', (chunk: Buffer) => (bytes += chunk.length));
        response.once('end', () => resolve(bytes));
      })
      .once('error', reject);
  });

async function sum(addresses: Iterable<string>): Promise<number> {
  const bytes = await Promise.all([...addresses].map(bytesOf));
  return bytes.reduce((total, one) => total + one, 0);
}

test('the sign-in page and every other route stay in their budgets', async ({ page, openAs, watch }, {
  annotations,
}) => {
  test.slow();
  watch.allow(/status of 401/);
  const signIn = await openAs(null);
  const first = loadedBy(signIn);
  await open(signIn, '/sign-in', 'Sign in');
  await signIn.waitForLoadState('networkidle');
  const [script, font] = [await sum(first.script), await sum(first.font)];
  annotations.push({ type: 'sign-in page, kB', description: `${script / 1000} of script, ${font / 1000} of fonts` });
  expect(script).toBeGreaterThan(0);
  expect(script).toBeLessThanOrEqual(budgets.script);
  expect(font).toBeLessThanOrEqual(budgets.font);

  const { path, run } = await demoJob(page.request);
  const routes = [
    '',
    '/edit',
    '/runs',
    '/runs/new',
    `/runs/${run('R30').id}`,
    `/runs/${run('R30').id}/edit`,
    '/schedule',
  ]
    .concat('/flags', '/documents', '/places/new', '/services/new', '/build-ups/new', '/specification/new')
    .map((route) => `${path}${route}`);
  const added: Record<string, number> = {};
  for (const route of ['/jobs', '/jobs/new', '/contacts', '/library', '/library/materials', ...routes]) {
    const fresh = await openAs('tamsin');
    const loaded = loadedBy(fresh);
    await open(fresh, route, /./);
    await fresh.waitForLoadState('networkidle');
    added[route.replace(path, '/jobs/:job').replace(run('R30').id, ':run')] = await sum(
      [...loaded.script].filter((address) => !first.script.has(address)),
    );
    await fresh.context().close();
  }
  annotations.push({ type: 'added by each route, bytes', description: JSON.stringify(added) });
  expect(Object.entries(added).filter(([, bytes]) => bytes > budgets.route)).toEqual([]);
});
