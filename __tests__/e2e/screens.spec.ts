import type { APIRequestContext } from '@playwright/test';
import { z } from 'zod';

import { ask } from './support/api';
import { expectAccessible } from './support/expect-accessible';
import { demoJob, emptyJob } from './support/jobs';
import { expectScreen, open } from './support/open';
import { expect, test } from './support/test';

const rowsSchema = z.array(z.looseObject({ id: z.string(), name: z.string().optional() }));

/** Every kind of thing that a job holds: its list, a new one's form, and the form of the first one. */
const sections = [
  { noun: 'places', title: 'Places', fresh: 'New place' },
  { noun: 'services', title: 'Services', fresh: 'New service' },
  { noun: 'build-ups', title: 'Build-ups', fresh: 'New build-up' },
  { noun: 'specification', title: 'Specification', fresh: /./ },
  { noun: 'levels', title: 'Levels', fresh: 'New level' },
  { noun: 'drawings', title: 'Drawings', fresh: 'New drawing' },
  { noun: 'addenda', title: 'Addenda', fresh: 'New addendum' },
] as const;

const first = async (request: APIRequestContext, path: string) => {
  const [row] = await ask(request, path, rowsSchema);
  if (!row) throw new Error(`${path} is empty`);
  return row.id;
};

for (const { noun, title, fresh } of sections) {
  test(`${title.toLowerCase()}: the list, one of it, a new one`, async ({ page }) => {
    const { path } = await demoJob(page.request);
    await open(page, `${path}/${noun}`, title);
    await expectAccessible(page);
    await open(page, `${path}/${noun}/${await first(page.request, `${path}/${noun}`)}`, /./);
    await expect(page.getByRole('form')).toBeVisible();
    await expectAccessible(page);
    await open(page, `${path}/${noun}/new`, fresh);
    await expect(page.getByRole('form')).toBeVisible();
    await expectAccessible(page);
  });
}

const screens = [
  { name: 'schedule', at: '/schedule', heading: 'Schedule' },
  { name: 'flags', at: '/flags', heading: 'Flags' },
  { name: 'documents', at: '/documents', heading: 'Documents' },
  { name: 'details of the job', at: '/edit', heading: /details$/ },
  { name: 'runs', at: '/runs', heading: 'Runs' },
  { name: 'new run', at: '/runs/new', heading: 'New run' },
] as const;

for (const { name, at, heading } of screens) {
  test(name, async ({ page }) => {
    const { path } = await demoJob(page.request);
    await open(page, `${path}${at}`, heading);
    await expectAccessible(page);
  });
}

test('jobs and a new job', async ({ page }) => {
  await open(page, '/jobs', 'Jobs');
  await expectAccessible(page);
  await open(page, '/jobs/new', 'New job');
  await expectAccessible(page);
});

test('overview, with what the job holds unfolded', async ({ page }) => {
  const { job, path } = await demoJob(page.request);
  await open(page, path, job.name);
  await expectAccessible(page);
  const folded = page.getByRole('main').getByRole('button', { expanded: false });
  for (let left = await folded.count(); left > 0; left -= 1) await folded.first().click();
  await expect(folded).toHaveCount(0);
  await expectAccessible(page);
});

test('run form on a screen of its own', async ({ page }) => {
  const { path, run } = await demoJob(page.request);
  await open(page, `${path}/runs/${run('R30').id}/edit`, 'Run R30');
  await expectAccessible(page);
});

test('the studies of a hot pipe, a cold one, a duct and a vessel', async ({ page }) => {
  const { path, run } = await demoJob(page.request);
  for (const number of ['R30', 'R32', 'D01', 'E02']) {
    await open(page, `${path}/runs/${run(number).id}`, /./);
    await expect(page.getByRole('radiogroup', { name: 'Thickness' })).toBeVisible();
    await expectAccessible(page);
  }
});

test('contacts: the list, one of it, a new one', async ({ page }) => {
  await open(page, '/contacts', 'Contacts');
  await expectAccessible(page);
  await open(page, `/contacts/${await first(page.request, '/contacts')}`, /./);
  await expect(page.getByRole('form')).toBeVisible();
  await expectAccessible(page);
  await open(page, '/contacts/new', 'New contact');
  await expectAccessible(page);
});

const library = {
  '/library': 'Library',
  '/library/pipes': 'Pipes and tubes',
  '/library/thicknesses': 'Made thicknesses',
  '/library/materials': 'Materials',
  '/library/finishes': 'Finishes',
  '/library/codes': 'Energy codes',
  '/library/touch': 'Touch temperatures',
};

for (const [address, title] of Object.entries(library)) {
  test(`library: ${title.toLowerCase()}`, async ({ page }) => {
    await open(page, address, title);
    await expectAccessible(page);
  });
}

test('library: one material and one energy code, opened from their lists', async ({ page }) => {
  for (const title of ['Materials', 'Energy codes'] as const) {
    await open(page, title === 'Materials' ? '/library/materials' : '/library/codes', title);
    await page.getByRole('main').locator('a[href*="/library/materials/"], a[href*="/library/codes/"]').first().click();
    await expect(page).toHaveURL(/\/library\/(materials|codes)\/.+/);
    await expectScreen(page, /./);
    await expectAccessible(page);
  }
});

test('a job with nothing in it says on each screen what comes next', async ({ page }) => {
  const job = await emptyJob(page.request);
  const path = `/jobs/${job.id}`;
  await open(page, path, job.name);
  await expectAccessible(page);
  const empty = [
    ['/runs', 'Runs', 'No runs yet'],
    ['/schedule', 'Schedule', /./],
    ['/flags', 'Flags', 'No flags'],
    ['/documents', 'Documents', 'Nothing is frozen yet'],
    ['/places', 'Places', 'No places yet'],
    ['/services', 'Services', 'No services yet'],
  ] as const;
  for (const [at, heading, says] of empty) {
    await open(page, `${path}${at}`, heading);
    await expect(page.getByRole('heading', { level: 2, name: says }).first()).toBeVisible();
    await expectAccessible(page);
  }
});

test.describe('problems', () => {
  test('an address that leads to nothing', async ({ page }) => {
    await open(page, '/no/such/page', /./);
    await expectAccessible(page);
  });

  test('a job that is not there', async ({ page, watch }) => {
    watch.allow(/status of 404/);
    await page.goto(`/jobs/${crypto.randomUUID()}`);
    await expect(page.getByRole('alert')).toBeVisible();
    await expectAccessible(page);
  });

  test('a run that is not there', async ({ page }) => {
    const { path } = await demoJob(page.request);
    await open(page, `${path}/runs/${crypto.randomUUID()}`, 'This run does not exist');
    await expectAccessible(page);
  });

  test('a server that does not answer, and does after all', async ({ page, watch }) => {
    watch.allow(/ERR_FAILED|status of 503/);
    const { path } = await demoJob(page.request);
    await page.route('**/api/jobs/*/runs', (route) => route.fulfill({ status: 503, body: 'down' }));
    await open(page, `${path}/runs`, 'Thickset does not answer');
    await expectAccessible(page);
    await page.unroute('**/api/jobs/*/runs');
    await page.getByRole('button', { name: 'Try again' }).click();
    await expectScreen(page, 'Runs');
  });
});
